import { readFile } from 'node:fs/promises';
import { text } from 'node:stream/consumers';

/** What a command says of one input. */
export type Answer =
  { readonly ok: true; readonly output: unknown } | { readonly ok: false; readonly error: CommandError };

export interface CommandError {
  readonly code: string;
  readonly message: string;
  /** Place in the input, such as `walls[2].length`; empty for the input as a whole. */
  readonly path: string;
}

/** Options a command takes, by name without dashes; each is followed by a value. */
export type Options = Readonly<Record<string, string>>;

export interface Command {
  /** Shown when the arguments make no sense, such as `npm run -s room -- FILE|-`. */
  readonly usage: string;
  readonly options?: readonly string[];
  /** Answers one input; `index` is its place in a batch, 0 for a single one. */
  answer(input: unknown, options: Options, index: number): Answer | Promise<Answer>;
}

/** Where a command reads and writes; the process's own streams outside of tests. */
export interface Streams {
  readonly stdin: NodeJS.ReadableStream;
  readonly stdout: { write(text: string): unknown };
  readonly stderr: { write(text: string): unknown };
}

export const DONE = 0;
export const FAILED = 1;
export const BAD_INPUT = 2;

/**
 * Runs a command over one input or an array of inputs, read from a file or, for `-`, from standard input. One input is
 * answered with one JSON line, an array with an array in the same order; a bad input of an array stands as
 * `{"error":...}` in its place. Other errors are one JSON line on standard error.
 *
 * @param args - command line behind the program's name
 * @returns the exit code: 0 done, 2 bad input, 1 failure of the program itself
 */
export async function runCommand(
  command: Command,
  args: readonly string[],
  streams: Streams = process,
): Promise<number> {
  const fail = (code: number, error: CommandError): number => {
    streams.stderr.write(`${JSON.stringify({ error })}\n`);
    return code;
  };
  const parsed = parseArguments(args, command.options ?? []);
  if (!parsed) return fail(BAD_INPUT, { code: 'usage', message: `Usage: ${command.usage}`, path: '' });
  const read = await readInput(parsed.source, streams.stdin);
  if (!read.ok) return fail(BAD_INPUT, read.error);
  try {
    if (!Array.isArray(read.output)) {
      const answer = await command.answer(read.output, parsed.options, 0);
      if (!answer.ok) return fail(BAD_INPUT, answer.error);
      streams.stdout.write(`${JSON.stringify(answer.output)}\n`);
      return DONE;
    }
    const answers: Answer[] = [];
    for (const [i, input] of read.output.entries()) answers.push(await command.answer(input, parsed.options, i));
    streams.stdout.write(`${JSON.stringify(answers.map((a) => (a.ok ? a.output : { error: a.error })))}\n`);
    return answers.every((a) => a.ok) ? DONE : BAD_INPUT;
  } catch (error) {
    const message = error instanceof Error ? error.message : String(error);
    return fail(FAILED, { code: 'failure', message, path: '' });
  }
}

function parseArguments(
  args: readonly string[],
  allowed: readonly string[],
): { readonly source: string; readonly options: Options } | null {
  const options: Record<string, string> = {};
  const sources: string[] = [];
  for (let i = 0; i < args.length; i++) {
    const arg = args[i]!;
    if (!arg.startsWith('--')) {
      sources.push(arg);
      continue;
    }
    const name = arg.slice(2);
    const value = args[++i];
    if (!allowed.includes(name) || value === undefined) return null;
    options[name] = value;
  }
  return sources.length === 1 ? { source: sources[0]!, options } : null;
}

async function readInput(source: string, stdin: NodeJS.ReadableStream): Promise<Answer> {
  let content: string;
  try {
    content = source === '-' ? await text(stdin) : await readFile(source, 'utf8');
  } catch {
    return { ok: false, error: { code: 'no_file', message: `Cannot read "${source}".`, path: '' } };
  }
  try {
    // A byte order mark is no part of JSON, but Windows editors leave one.
    return { ok: true, output: JSON.parse(content.replace(/^\uFEFF/, '')) as unknown };
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error);
    return { ok: false, error: { code: 'bad_json', message: `Not JSON: ${reason}.`, path: '' } };
  }
}
