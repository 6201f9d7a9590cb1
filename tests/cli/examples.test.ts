import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

import { answerNest } from '@/server/cli/answer-nest';
import { answerPlan } from '@/server/cli/answer-plan';
import { answerRoom } from '@/server/cli/answer-room';
import type { Answer } from '@/server/cli/batch';
import type { NestPlan } from '@/geometry/nest/types';
import type { PlanOutput } from '@/shared/layout/plan-output';
import type { RoomOutput } from '@/shared/layout/room-output';

const root = path.resolve(__dirname, '../..');
const example = (name: string): unknown => JSON.parse(readFileSync(path.join(root, 'docs/examples', name), 'utf8'));

function outputOf<T>(answer: Answer): T {
  if (!answer.ok) throw new Error(answer.error.message);
  return answer.output as T;
}

describe('the examples of the README', () => {
  it('give the room whose corners are 91.04 and 88.55 degrees, and a tie to tape next', () => {
    const room = outputOf<RoomOutput>(answerRoom(example('scullery-room.json')));
    expect(room.corners.map(({ angle }) => angle.toFixed(2))).toEqual(['91.04', '88.55']);
    expect(room.points.map(([x, y]) => `${x.toFixed(2)} ${y.toFixed(2)}`)).toEqual([
      '0.00 0.00',
      '98.25 0.00',
      '100.94 -148.43',
      '14.88 -147.80',
    ]);
    expect([room.dof, room.chi2.toFixed(3)]).toEqual([1, '0.345']);
    expect(room.next?.kind).toBe('tie');
  });

  it('cut two parts from one slab of 120 in, with one cut through both mitered ends', () => {
    const plan = outputOf<NestPlan>(answerNest(example('two-runs.json')));
    expect(plan.slabs.map(({ stock }) => stock)).toEqual(['S120']);
    expect([plan.cost, plan.lowerBound, plan.proved]).toEqual([47900, 47900, true]);
    expect(plan.slabs[0]!.cuts.filter(({ shared }) => shared)).toHaveLength(1);
  });

  it('lay four pieces on three slabs for $1,247 and write their sheets', async () => {
    const sheets = mkdtempSync(path.join(os.tmpdir(), 'offsquare-examples-'));
    try {
      const plan = outputOf<PlanOutput & { sheets: string[] }>(
        await answerPlan(example('scullery.json'), { sheets }, 0),
      );
      expect(plan.pieces.map(({ letter }) => letter)).toEqual(['P', 'Q', 'R', 'S']);
      expect(plan.slabs).toHaveLength(3);
      expect(plan.cost).toMatchObject({ slabs: 124700, proved: true });
      expect(plan.sheets).toContain(path.join(sheets, '1-quay-street-scullery-cut.pdf'));
      expect(readFileSync(plan.sheets[0]!).subarray(0, 5).toString()).toBe('%PDF-');
    } finally {
      rmSync(sheets, { recursive: true, force: true });
    }
  });
});
