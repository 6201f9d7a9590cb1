import { mkdirSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { parseArgs } from 'node:util';

import type { BenchRow } from './bench/bench-row';
import { rows as bytes } from './bench/bytes';
import { rows as liveChain } from './bench/live-chain';
import { rows as nest } from './bench/nest';
import { rows as room } from './bench/room';
import { rows as sheet } from './bench/sheet';
import { benchTable } from './bench/table';

/** What can be measured, in the order of the table. */
const PARTS: Readonly<Record<string, (mode: { readonly short: boolean }) => Promise<BenchRow[]>>> = {
  'live-chain': liveChain,
  room,
  nest,
  sheet,
  bytes,
};

const USE = `Use: npm run bench -- [--json FILE] [--only ${Object.keys(PARTS).join(',')}] [--short]`;

function readArgs(): { json: string; only: readonly string[]; short: boolean } {
  try {
    const { values } = parseArgs({
      options: { json: { type: 'string' }, only: { type: 'string' }, short: { type: 'boolean' } },
    });
    const only = values.only?.split(',') ?? Object.keys(PARTS);
    const unknown = only.filter((name) => !(name in PARTS));
    if (unknown.length > 0) throw new Error(`There is nothing called ${unknown.join(', ')} to measure.`);
    return { json: values.json ?? path.resolve(__dirname, '../out/bench.json'), only, short: values.short ?? false };
  } catch (error) {
    console.error(`${(error as Error).message}\n${USE}`);
    process.exit(2);
  }
}

/** Prints one table of ratios and writes the same as JSON. A part that cannot be measured is said and ends in exit code 1. */
async function main(): Promise<void> {
  const { json, only, short } = readArgs();
  const rows: BenchRow[] = [];
  for (const name of only) {
    console.error(`Measuring ${name}`);
    try {
      rows.push(...(await PARTS[name]!({ short })));
    } catch (error) {
      console.error(`${name} could not be measured:`, error);
      process.exitCode = 1;
    }
  }
  console.log(benchTable(rows));
  mkdirSync(path.dirname(path.resolve(json)), { recursive: true });
  const machine = { node: process.version, processor: os.cpus()[0]?.model ?? 'unknown', cores: os.cpus().length };
  writeFileSync(json, `${JSON.stringify({ at: new Date().toISOString(), ...machine, rows }, null, 2)}\n`);
}

void main();
