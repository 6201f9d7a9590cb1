import Papa from 'papaparse';

import type { StockSlab } from '@/shared/contracts/stock';
import { readSlab, SLAB_FIELDS, slabTexts, type SlabBody, type SlabField, type SlabTexts } from './read-slab';

/** One line of a file: the slab it gives, or what is wrong with it, column by column. */
export interface CsvRow {
  /** As a spreadsheet counts: the head is line 1. */
  readonly line: number;
  readonly code: string;
  readonly slab: SlabBody | null;
  readonly errors: readonly string[];
}

export interface CsvReading {
  readonly rows: readonly CsvRow[];
  /** Columns that mean nothing here and are left out. */
  readonly ignored: readonly string[];
  /** Why nothing of the file can be read, or null. */
  readonly problem: string | null;
}

/** More lines than any list of slabs has. */
const MOST_ROWS = 500;

const NEEDED: readonly SlabField[] = ['code', 'species', 'thickness', 'length', 'depth', 'price'];

/**
 * Reads slabs from a CSV file (RFC 4180; comma, semicolon or tab) whose first line names the columns. Lines that cannot be
 * read are named with every reason; the others are kept.
 *
 * @param taken - codes of slabs the shop has already
 */
export function readStockCsv(text: string, metric: boolean, taken: ReadonlySet<string>): CsvReading {
  const parsed = Papa.parse<Record<string, string>>(text.replace(/^\uFEFF/, ''), {
    header: true,
    skipEmptyLines: 'greedy',
    transformHeader: (name) => name.trim().toLowerCase().replaceAll('_', ' '),
  });
  const names = parsed.meta.fields ?? [];
  const missing = NEEDED.filter((field) => !names.includes(field));
  const nothing = (problem: string): CsvReading => ({ rows: [], ignored: [], problem });
  if (missing.length > 0)
    return nothing(
      `The first line has to name the columns; ${missing.join(', ')} ${missing.length > 1 ? 'are' : 'is'} not among them. Nothing was read.`,
    );
  if (parsed.data.length === 0) return nothing('There is no slab in this file: only its first line.');
  if (parsed.data.length > MOST_ROWS) return nothing(`More than ${MOST_ROWS} lines; split the file. Nothing was read.`);
  const seen = new Set(taken);
  const broken = new Map(parsed.errors.map((error) => [error.row ?? -1, error.message]));
  const rows = parsed.data.map((cells, i): CsvRow => {
    const read = readSlab(textsOf(cells), metric);
    const code = (cells.code ?? '').trim();
    const errors = [
      ...(broken.has(i) ? [`The line is torn: ${broken.get(i)}`] : []),
      ...(read.ok ? [] : Object.entries(read.errors).map(([field, why]) => `${field}: ${why}`)),
      ...(code !== '' && seen.has(code) ? [`code: ${code} is taken. Give this one another.`] : []),
    ];
    seen.add(code);
    return { line: i + 2, code: code || 'no code', slab: read.ok && errors.length === 0 ? read.slab : null, errors };
  });
  const ignored = names.filter((name) => name !== '' && !SLAB_FIELDS.includes(name as SlabField));
  return { rows, ignored, problem: null };
}

const textsOf = (cells: Record<string, string>): SlabTexts =>
  Object.fromEntries(SLAB_FIELDS.map((field) => [field, cells[field] ?? '']));

/** The stock as a file that can be read back; texts that a spreadsheet would take for a formula are quoted. */
export function writeStockCsv(slabs: readonly StockSlab[], metric: boolean): string {
  const rows = slabs.map((slab) => {
    const texts = slabTexts(slab, metric);
    return SLAB_FIELDS.map((field) => texts[field] ?? '');
  });
  return Papa.unparse({ fields: [...SLAB_FIELDS], data: rows }, { escapeFormulae: true, newline: '\r\n' });
}
