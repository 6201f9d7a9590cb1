import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

import { run } from '../setup/children.mjs';

const FILES: Readonly<Record<string, string>> = {
  'package.json': JSON.stringify({ name: 'empty', version: '1.0.0', private: true, main: 'expo-router/entry' }),
  'app.json': JSON.stringify({
    expo: {
      name: 'Empty',
      slug: 'empty',
      scheme: 'empty',
      platforms: ['web'],
      web: { bundler: 'metro', output: 'single' },
      plugins: ['expo-router'],
    },
  }),
  // One word, so that there is something to wait for.
  'app/index.tsx': `import { Text } from 'react-native';\n\nexport default function Empty() {\n  return <Text>empty</Text>;\n}\n`,
};

/**
 * Exports an Expo Router app of one empty screen with the packages of this checkout, and takes everything away afterwards.
 *
 * @param root - absolute path of the checkout
 * @param measure - gets the folder of the exported app
 * @throws Error with the end of what the bundler said when it fails
 */
export async function withEmptyApp<T>(root: string, measure: (folder: string) => Promise<T>): Promise<T> {
  const place = mkdtempSync(path.join(os.tmpdir(), 'offsquare-empty-app-'));
  try {
    mkdirSync(path.join(place, 'app'));
    for (const [name, text] of Object.entries(FILES)) writeFileSync(path.join(place, name), text);
    symlinkSync(path.join(root, 'node_modules'), path.join(place, 'node_modules'));
    const folder = path.join(place, 'dist');
    const { code, output } = await run(
      process.execPath,
      [path.join(root, 'node_modules/expo/bin/cli'), 'export', '-p', 'web', '--output-dir', folder],
      {
        cwd: place,
        // A cache of its own: the bundler keeps the place of the routes in what it cached for this checkout.
        env: {
          ...process.env,
          TMPDIR: place,
          NODE_ENV: 'production',
          CI: '1',
          EXPO_NO_TELEMETRY: '1',
          EXPO_OFFLINE: '1',
        },
      },
    );
    if (code !== 0) throw new Error(`The empty app could not be exported:\n${output.trim().slice(-2000)}`);
    return await measure(folder);
  } finally {
    rmSync(place, { recursive: true, force: true });
  }
}
