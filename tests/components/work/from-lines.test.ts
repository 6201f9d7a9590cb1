import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';

import { FORMULAS } from '@/geometry/findings/formulas';
import { WHERE_FROM } from '@/geometry/findings/where-from';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { CONNECTOR_SIZES } from '@/geometry/wood/connector-sizes';
import { jobSettings } from '@/geometry/wood/job-settings';

const FOLDER = path.resolve(__dirname, '../../../components/work');
const NAMES = new Set([...FORMULAS, ...WHERE_FROM].map(({ name }) => name));

describe('links to where a figure is from', () => {
  it('lead to a line that is there, from every screen of the work', () => {
    const asked = readdirSync(FOLDER)
      .filter((file) => file.endsWith('.tsx'))
      .flatMap((file) => [...readFileSync(path.join(FOLDER, file), 'utf8').matchAll(/\b(?:from|line)="([^"]+)"/g)])
      .map((match) => match[1]!);
    expect(asked.length).toBeGreaterThan(15);
    expect(asked.filter((name) => !NAMES.has(name))).toEqual([]);
  });

  it('has a name of its own for every line', () => {
    const all = [...FORMULAS, ...WHERE_FROM].map(({ name }) => name);
    expect(all.filter((name, i) => all.indexOf(name) !== i)).toEqual([]);
  });
});

describe('jobSettings', () => {
  const fixing = { rail: 1.5, backsplash: 0.5 };

  it("are the shop's own while the job has nothing of its own", () => {
    expect(jobSettings({ fixing: { ...fixing, screw: 0, connector: '' } }, DEFAULT_SETTINGS)).toBe(DEFAULT_SETTINGS);
    expect(jobSettings({ fixing: { ...fixing, connector: 'a nail' } }, DEFAULT_SETTINGS)).toBe(DEFAULT_SETTINGS);
  });

  it('take the screw and the connector of the job, and leave distances to the shop', () => {
    const dowel = CONNECTOR_SIZES.find(({ kind }) => kind === 'dowel')!;
    const own = jobSettings({ fixing: { ...fixing, screw: 2.25, connector: dowel.name } }, DEFAULT_SETTINGS);
    expect(own.screws.lengths).toEqual([2.25]);
    expect(own.connectors).toMatchObject({
      kind: 'dowel',
      width: dowel.width,
      depth: dowel.depth,
      spacing: 6,
      cover: 0.25,
    });
  });
});
