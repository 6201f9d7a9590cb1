import { Readable } from 'node:stream';

import { BAD_INPUT, DONE, FAILED, runCommand } from '@/server/cli/batch';
import type { Answer, Command, Options } from '@/server/cli/batch';

function streams(input: string) {
  const out: string[] = [];
  const err: string[] = [];
  const write = (into: string[]) => ({ write: (text: string) => into.push(text) });
  return { out, err, streams: { stdin: Readable.from([input]), stdout: write(out), stderr: write(err) } };
}

/** Doubles a number, refuses a text and breaks on null. */
function double(input: unknown): Answer {
  if (input === null) throw new Error('nothing to double');
  if (typeof input === 'number') return { ok: true, output: 2 * input };
  return { ok: false, error: { code: 'no_number', message: 'Not a number.', path: 'x' } };
}

const command: Command = { usage: 'double FILE|-', options: ['sheets'], answer: double };

describe('runCommand', () => {
  it('answers one input with one line', async () => {
    const io = streams('21');
    expect(await runCommand(command, ['-'], io.streams)).toBe(DONE);
    expect(io.out.join('')).toBe('42\n');
    expect(io.err).toEqual([]);
  });

  it('keeps the order of a batch and puts errors in their place', async () => {
    const io = streams('[1, "x", 3]');
    expect(await runCommand(command, ['-'], io.streams)).toBe(BAD_INPUT);
    expect(JSON.parse(io.out.join(''))).toEqual([
      2,
      { error: { code: 'no_number', message: 'Not a number.', path: 'x' } },
      6,
    ]);
  });

  it('waits for answers that take their time, one after the other', async () => {
    const io = streams('[3, 2, 1]');
    const order: number[] = [];
    const slow: Command = {
      usage: '',
      answer: async (input, _options, index) => {
        await new Promise((resolve) => setTimeout(resolve, Number(input)));
        order.push(index);
        return { ok: true, output: input };
      },
    };
    expect(await runCommand(slow, ['-'], io.streams)).toBe(DONE);
    expect(order).toEqual([0, 1, 2]);
    expect(JSON.parse(io.out.join(''))).toEqual([3, 2, 1]);
  });

  it('hands options and the place in the batch on', async () => {
    const io = streams('[0, 0]');
    const seen: [Options, number][] = [];
    const spy: Command = {
      ...command,
      answer: (_input, options, index) => {
        seen.push([options, index]);
        return { ok: true, output: null };
      },
    };
    await runCommand(spy, ['--sheets', 'out', '-'], io.streams);
    expect(seen).toEqual([
      [{ sheets: 'out' }, 0],
      [{ sheets: 'out' }, 1],
    ]);
  });

  it('tells a failure of the program from a bad input: exit 1', async () => {
    const io = streams('null');
    expect(await runCommand(command, ['-'], io.streams)).toBe(FAILED);
    expect(JSON.parse(io.err.join(''))).toEqual({ error: { code: 'failure', message: 'nothing to double', path: '' } });
    expect(io.out).toEqual([]);
  });

  it('refuses an option without its value', async () => {
    const io = streams('1');
    expect(await runCommand(command, ['-', '--sheets'], io.streams)).toBe(BAD_INPUT);
    expect(io.err.join('')).toContain('Usage: double FILE|-');
  });
});
