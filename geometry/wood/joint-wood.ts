import type { ConnectorSettings, ShopSettings } from '../core/settings';
import type { TopJoint, TopSeam, Tops } from '../top/types';
import { distance } from '../core/vector';
import { connectorsAlong, stretchesInCutouts } from './connectors';
import { drawboltsAlong } from './drawbolts';
import { jointSeason } from './joint-season';
import type { JointWood, Movement } from './types';

/** Lengths of the two runs a joint ties together, from the corner to their far ends along the back, inches. */
export function legsOf(joint: Pick<TopJoint, 'between'>, runs: Tops['runs']): readonly [number, number] {
  const leg = (id: string) => {
    const run = runs.find((r) => r.id === id);
    return run ? Math.max(run.backTo - run.backFrom, run.frontTo - run.frontFrom) : 0;
  };
  return [leg(joint.between[0]), leg(joint.between[1])];
}

/**
 * What wood and hardware add to a joint: seasonal opening, swing, connector centres.
 *
 * A joint made on site is pulled together by drawbolts, and its connectors keep clear of them.
 */
export function jointWood(
  joint: TopJoint,
  tops: Pick<Tops, 'runs' | 'cutouts'>,
  movement: Pick<Movement, 'emc' | 'coefficient'>,
  settings: Pick<ShopSettings, 'connectors'>,
): JointWood {
  const season = jointSeason(joint, legsOf(joint, tops.runs), movement);
  const bolts = joint.assembled === 'site' ? drawboltsAlong(joint.length) : [];
  return {
    seasonal: season.seasonal,
    swing: season.swing,
    connectors: connectorsAlong(joint, settings.connectors, inCutouts(joint, tops, settings.connectors), bolts),
  };
}

/** Connector centres along a square seam, inches from its back point. */
export function seamConnectors(
  seam: Pick<TopSeam, 'from' | 'to'>,
  tops: Pick<Tops, 'cutouts'>,
  settings: Pick<ShopSettings, 'connectors'>,
): readonly number[] {
  const length = distance(seam.from, seam.to);
  const blocked = inCutouts(seam, tops, settings.connectors);
  return connectorsAlong({ length, angles: [90, 90] }, settings.connectors, blocked);
}

const inCutouts = (line: Pick<TopSeam, 'from' | 'to'>, tops: Pick<Tops, 'cutouts'>, settings: ConnectorSettings) =>
  stretchesInCutouts(
    line.from,
    line.to,
    tops.cutouts.map((c) => c.outline),
    settings,
  );
