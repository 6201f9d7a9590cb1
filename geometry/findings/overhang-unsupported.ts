import type { Island } from '../core/layout';
import { dot, subtract } from '../core/vector';
import type { LaidRun } from '../top/types';
import type { WallFrame } from '../top/wall-frame';
import { checkOverhang, EDGE_LOAD, type OverhangWay } from '../wood/overhang';
import { sourceText } from '../wood/sourced';
import { speciesOf } from '../wood/species';
import { baseReach, carriesTop } from '../wood/under';
import { basesUnder, runName, size, type Facts, type Rule } from './facts';
import { finding } from './finding';
import type { Finding } from './types';
import { capital, pounds, sizePair } from './words';

interface Overhang {
  readonly side: 'front' | 'back' | 'left' | 'right';
  readonly way: OverhangWay;
  readonly length: number;
}

/** A part of a top that hangs past the cabinets further than it stays stiff. */
export const overhangUnsupported: Rule = (facts) => {
  const species = speciesOf(facts.layout.material.species);
  if (!species || facts.layout.material.thickness <= 0) return [];
  const { grain, thickness } = facts.layout.material;
  const check = (id: string, all: readonly Overhang[]): readonly Finding[] =>
    all.flatMap((overhang) => {
      const checked = checkOverhang(species, grain, overhang.way, overhang.length, thickness);
      return checked.holds ? [] : [tooFar(facts, id, overhang, checked)];
    });
  return [
    ...facts.tops.runs.flatMap((laid) => {
      const wall = facts.wallById.get(laid.wall);
      return wall ? check(laid.id, overhangs(facts, laid, wall)) : [];
    }),
    ...facts.layout.islands.flatMap((island) =>
      facts.piecesOn.has(island.id) ? check(island.id, hangsOf(island)) : [],
    ),
  ];
};

/** What was typed for an island: seats along its front and back hang across the grain, its ends along it. */
function hangsOf({ hangs = {} }: Island): readonly Overhang[] {
  const ways = { front: 'across', back: 'across', left: 'along', right: 'along' } as const;
  return (Object.keys(ways) as Overhang['side'][]).map((side) => ({ side, way: ways[side], length: hangs[side] ?? 0 }));
}

/**
 * Past the front of the shallowest cabinet, across the grain; past the last cabinet at an open end, along it. What stands
 * below a run on the far side of a wall is not drawn, so only what was typed for its open ends is known.
 */
function overhangs(facts: Facts, laid: LaidRun, wall: WallFrame): readonly Overhang[] {
  const [from, to] = [Math.min(laid.backFrom, laid.frontFrom), Math.max(laid.backTo, laid.frontTo)];
  const far = facts.runById.get(laid.id)?.side === 'back';
  const bases = (far ? [] : basesUnder(facts, laid)).filter((base) => {
    const [a, b] = baseReach(wall, base);
    return carriesTop(base) && b > from && a < to;
  });
  const ends: Overhang[] = (['left', 'right'] as const).flatMap((side): Overhang[] => {
    const end = laid[side];
    if (end.kind !== 'open') return [];
    const reaches = bases.map((base) => baseReach(wall, base));
    const drawn =
      side === 'left' ? Math.min(...reaches.map((r) => r[0])) - from : to - Math.max(...reaches.map((r) => r[1]));
    return [{ side, way: 'along', length: bases.length > 0 ? drawn : end.overhang }];
  });
  if (bases.length === 0) return ends;
  const reach = dot(subtract(laid.front.origin, wall.start), wall.inward);
  const front = reach - Math.min(...bases.map((base) => base.depth));
  return [{ side: 'front', way: 'across', length: front }, ...ends];
}

function tooFar(
  facts: Facts,
  id: string,
  { side, way, length }: Overhang,
  check: ReturnType<typeof checkOverhang>,
): Finding {
  const [sags, limit] = sizePair(check.sag, check.allowed, facts.layout.step);
  return finding({
    code: 'overhang-unsupported',
    severity: 'warn',
    text: `${capital(runName(facts, id))} hangs ${size(facts, length)} past the cabinets at the ${side}, ${way} the grain: ${pounds(EDGE_LOAD.value)} on the edge bends it ${sags}, and ${limit} is the limit.`,
    action: `Put brackets or a panel under it, or keep it to ${size(facts, Math.floor(check.longest * 8) / 8)}. Advice, not an engineer's approval.`,
    at: { run: id, detail: side },
    source: `P L^3 / 3 E I with E of the Wood Handbook; ${sourceText(EDGE_LOAD)}`,
  });
}
