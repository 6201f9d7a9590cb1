import { takeOffBetween, type Scribe } from '../top/scribe';
import { constant, sourceText } from '../wood/sourced';
import { baseReach, carriesTop } from '../wood/under';
import { basesUnder, cutoutName, runName, size, type Facts, type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';
import { weakens } from './strip-widths';
import type { Finding } from './types';
import { capital, sizePair } from './words';

/** The front edge stands at least this far past the faces of the cabinets, inches. */
export const FRONT_REACH = constant(
  'Front edge past the cabinet faces',
  0.5,
  'in',
  'our choice',
  'no published figure',
);

/** What scribing to a bowed wall costs: a front edge that no longer covers the cabinets, a back strip that gets narrow. */
export const scribeEatsDepth: Rule = (facts) =>
  facts.wallFit.scribes
    .filter((scribe) => scribe.takeOff > 0)
    .flatMap((scribe) => [...frontShort(facts, scribe), ...stripNarrow(facts, scribe)]);

function frontShort(facts: Facts, scribe: Scribe): readonly Finding[] {
  const laid = facts.laidById.get(scribe.run);
  const wall = laid && facts.wallById.get(laid.wall);
  if (!laid || !wall) return [];
  const under = basesUnder(facts, laid).filter((base) => {
    const [from, to] = baseReach(wall, base);
    return carriesTop(base) && from < laid.backTo && to > laid.backFrom;
  });
  if (under.length === 0) return [];
  const deepest = under.reduce((a, b) => (b.depth > a.depth ? b : a));
  const reach = scribe.standoff + laid.depth - scribe.shift - deepest.depth;
  if (reach >= FRONT_REACH.value) return [];
  const [is, limit] = sizePair(reach, FRONT_REACH.value, facts.layout.step);
  return [
    finding({
      code: 'scribe-front-short',
      severity: 'warn',
      text: `Scribing ${runName(facts, scribe.run)} moves it back ${size(facts, scribe.shift)}: its front edge then stands ${is} past the cabinets, and ${limit} is the least.`,
      action: 'Make the top deeper, pull the cabinets back, or cover the gap with a thicker backsplash.',
      at: { run: scribe.run, wall: laid.wall },
      source: sourceText(FRONT_REACH),
    }),
  ];
}

function stripNarrow(facts: Facts, scribe: Scribe): readonly Finding[] {
  const least = facts.settings.seams.strip;
  return facts.tops.cutouts
    .filter((cutout) => cutout.on === scribe.run && weakens(cutout) && cutout.backStrip >= least)
    .flatMap((placed) => {
      const cutout = facts.cutoutById.get(placed.id);
      if (!cutout) return [];
      const half = cutout.width / 2;
      const taken = takeOffBetween(scribe, cutout.centre - half, cutout.centre + half);
      const left = placed.backStrip - taken;
      if (left >= least) return [];
      const [is, limit] = sizePair(Math.max(0, left), least, facts.layout.step);
      return [
        finding({
          code: 'scribe-strip-narrow',
          severity: 'warn',
          text: `${capital(cutoutName(facts, placed))} keeps ${is} behind it once ${size(facts, taken)} is scribed off; ${limit} is the least.`,
          action: 'Move the cutout forward, make the top deeper, or cover the gap with a thicker backsplash.',
          at: { cutout: placed.id, run: scribe.run, pieces: placed.letters },
          source: PRACTICE,
        }),
      ];
    });
}
