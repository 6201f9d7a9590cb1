import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { existsSync } from 'node:fs';
import path from 'node:path';
import { pathToFileURL } from 'node:url';

const MODULES = pathToFileURL(path.resolve(__dirname, '../../../scripts/setup')).href;

/** Runs a step that goes on for a minute in a process of its own, and gives the process and the number of the step's program. */
async function startLongStep() {
  const source = `
    import { passSignalsOn, run } from '${MODULES}/children.mjs';
    import { exitCodeFor } from '${MODULES}/problem.mjs';
    passSignalsOn();
    run('sh', ['-c', 'echo $$; sleep 60 & wait'], { onOutput: (text) => process.stdout.write(text) })
      .catch((error) => { process.exitCode = exitCodeFor(error); console.log(error.name); });
  `;
  const parent = spawn(process.execPath, ['--input-type=module', '-e', source], {
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  let said = '';
  parent.stdout.setEncoding('utf8').on('data', (text: string) => {
    said += text;
  });
  await once(parent.stdout, 'data');
  return { parent, program: Number(said), said: () => said };
}

describe('run', () => {
  it.each([
    ['SIGINT', 130],
    ['SIGTERM', 143],
    ['SIGHUP', 129],
  ] as const)('ends its program and tells the caller when we get %s', async (signal, exitCode) => {
    const { parent, program, said } = await startLongStep();
    expect(existsSync(`/proc/${program}`)).toBe(true);
    parent.kill(signal);
    const [code] = (await once(parent, 'close')) as [number];
    expect(code).toBe(exitCode);
    expect(said()).toMatch(/Interrupted/);
    expect(existsSync(`/proc/${program}`)).toBe(false);
  });
});
