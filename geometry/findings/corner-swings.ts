import { jointSeason } from '../wood/joint-season';
import { legsOf } from '../wood/joint-wood';
import { jointName, size, type Facts, type Rule } from './facts';
import { finding } from './finding';
import { seasonSeverity } from './season-limits';
import { MOVEMENT_SOURCE } from './sources';
import type { Finding } from './types';

/** A corner glued in the shop: it does not open, its legs swing, against the gap at the wall and the travel of the slots. */
export const cornerSwings: Rule = (facts) =>
  facts.joints.flatMap((joint) => {
    if (joint.assembled !== 'shop') return [];
    const legs = legsOf(joint, facts.tops.runs);
    const longer = legs[0] >= legs[1] ? 0 : 1;
    const season = jointSeason(joint, legs, facts.movement);
    const run = facts.runById.get(joint.between[longer]);
    const severity = seasonSeverity(season.swing, facts.layout.climate.heated);
    if (!run || severity === null) return [];
    return [swings(facts, joint, legs[longer], run.backGap, season)];
  });

function swings(
  facts: Facts,
  joint: Facts['joints'][number],
  leg: number,
  backGap: number,
  season: ReturnType<typeof jointSeason>,
): Finding {
  const travel = facts.movement.slot - facts.settings.screws.shank;
  const towards = season.turnWet * leg;
  const free = Math.min(backGap, travel);
  const fits = towards <= backGap && season.swing <= travel;
  const heated = facts.layout.climate.heated;
  return finding({
    code: 'corner-swings',
    severity: fits && heated ? 'note' : 'warn',
    text: `${jointName(joint)} is glued and turns with the seasons: the end of its ${size(facts, leg)} leg swings ${size(facts, season.swing)}, ${size(facts, towards)} of it towards the wall. The gap there is ${size(facts, backGap)} and the slots give ${size(facts, travel)}.${heated ? '' : ' The house is unheated in winter, so it works every year.'}`,
    action: fits
      ? 'Keep the slots square to the wall and the screws snug, not tight.'
      : `Leave more than ${size(facts, free)} for it: a wider gap and longer slots at that end, edge-grain staves, or join on site.`,
    at: { joint: joint.between, pieces: joint.letters },
    source: MOVEMENT_SOURCE,
  });
}
