import type { Base } from '@/geometry/core/layout';
import { OPEN, run } from '@/tests/helpers/tops-builder';
import type { RuleCases } from './case';
import { base, cornerKitchen, kitchen, sink } from './kitchen';

const pinned = (at: number, bases: readonly Base[] = []) =>
  kitchen({ walls: [140], layout: { seams: [{ on: '1', at }], bases: [...bases] } });

const dishwasher = base({ id: 'd', kind: 'dishwasher', from: 40, to: 64 });

const withSink = (at: number, centre = 70) =>
  kitchen({ walls: [140], layout: { seams: [{ on: '1', at }], cutouts: [sink({ centre })] } });

/** Front edge of wall A's run ends at 54 3/4 in, its back edge at 79 3/4. */
const nearJoint = (at: number) => cornerKitchen({ layout: { seams: [{ on: '1', at }] } });

const nearOpen = (at: number) =>
  kitchen({ walls: [140], layout: { runs: [run('1', 'A', { left: OPEN, right: OPEN })], seams: [{ on: '1', at }] } });

const narrowSink = (width: number) =>
  kitchen({ walls: [140], layout: { seams: [{ on: '1', at: 70 }], cutouts: [sink({ centre: 70, width })] } });

export const SEAM_CASES: RuleCases = {
  'seam-unsupported': {
    severity: 'stop',
    raises: () => pinned(52, [dishwasher]),
    spares: () => pinned(43, [dishwasher]),
    says: ['P to Q', 'dishwasher', '12 in', '3 in'],
    other: () => pinned(44, [dishwasher]),
  },
  'seam-near-cutout': {
    severity: 'warn',
    raises: () => withSink(50),
    spares: () => withSink(49),
    says: ['5 in beside', '6 in'],
    other: () => withSink(52),
  },
  'seam-near-joint': {
    severity: 'warn',
    raises: () => nearJoint(50),
    spares: () => nearJoint(48.75),
    says: ['4 3/4 in', 'joint on the right', '6 in'],
    other: () => nearJoint(52),
  },
  'seam-near-open-end': {
    severity: 'warn',
    raises: () => nearOpen(10),
    spares: () => nearOpen(11),
    says: ['11 in', 'open end on the left', '12 in'],
    other: () => nearOpen(5),
  },
  'short-piece': {
    severity: 'warn',
    raises: () => pinned(11),
    spares: () => pinned(12),
    says: ['Piece P', '11 in', '12 in'],
    other: () => pinned(9),
  },
  'seam-no-cleats': {
    severity: 'note',
    // 3 in of cleat and 1 in clear of the finished edge on either side of the seam.
    raises: () => narrowSink(7.9),
    spares: () => narrowSink(8),
    says: ['The sink', '4 in', 'P to Q'],
  },
};
