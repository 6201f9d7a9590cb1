import { execFileSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

/** The whole document. */
export async function readAll(stream: NodeJS.ReadableStream): Promise<Buffer> {
  const chunks: Buffer[] = [];
  for await (const chunk of stream) chunks.push(Buffer.from(chunk as Uint8Array));
  return Buffer.concat(chunks);
}

/** Runs one of poppler's programs on a document: a reader that shares nothing with what wrote it. */
export function poppler(program: string, args: readonly string[], pdf: Buffer, toStdout = true): string {
  const folder = mkdtempSync(path.join(tmpdir(), 'sheet-'));
  try {
    const file = path.join(folder, 'sheet.pdf');
    writeFileSync(file, pdf);
    return execFileSync(program, [...args, file, ...(toStdout ? ['-'] : [])], { encoding: 'utf8' });
  } finally {
    rmSync(folder, { recursive: true });
  }
}

/** Lines of text in the order in which they were painted, pages apart. */
export const textLines = (pdf: Buffer): string[][] =>
  poppler('pdftotext', ['-raw', '-enc', 'UTF-8'], pdf)
    .split('\f')
    .filter((page) => page.trim() !== '')
    .map((page) => page.split('\n').filter((line) => line !== ''));
