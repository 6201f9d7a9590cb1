import type { ConnectorSettings } from '../core/settings';
import type { Standing } from './sourced';

/** One size of connector: the mortise it needs in each of the two pieces, inches. */
export interface ConnectorSize {
  readonly name: string;
  readonly kind: ConnectorSettings['kind'];
  /** Along the joint. */
  readonly width: number;
  /** Into each piece. */
  readonly depth: number;
  /** Across the thickness of the top. */
  readonly thickness: number;
  readonly standing: Standing;
}

const MM = 1 / 25.4;

/** Usual sizes to pick from; the mortise is a little deeper than half the connector, for glue. */
export const CONNECTOR_SIZES: readonly ConnectorSize[] = [
  size('Loose tenon 8 x 40 mm', 'loose tenon', 22 * MM, 21 * MM, 8 * MM),
  size('Loose tenon 8 x 50 mm', 'loose tenon', 22 * MM, 26 * MM, 8 * MM),
  size('Loose tenon 10 x 50 mm', 'loose tenon', 24 * MM, 26 * MM, 10 * MM),
  size('Loose tenon 15/16 x 2 1/4 in', 'loose tenon', 15 / 16, 1 + 3 / 16, 3 / 8),
  size('Dowel 3/8 x 2 in', 'dowel', 3 / 8, 1 + 1 / 16, 3 / 8),
  size('Dowel 1/2 x 2 1/2 in', 'dowel', 1 / 2, 1 + 5 / 16, 1 / 2),
  size('Biscuit no. 10', 'biscuit', 2 + 1 / 4, 3 / 8 + 1 / 32, 5 / 32),
  size('Biscuit no. 20', 'biscuit', 2 + 1 / 2, 15 / 32 + 1 / 32, 5 / 32),
];

function size(
  name: string,
  kind: ConnectorSize['kind'],
  width: number,
  depth: number,
  thickness: number,
): ConnectorSize {
  return { name, kind, width, depth, thickness, standing: 'from memory' };
}

/** The settings with another size of connector; distances stay the shop's. */
export const withSize = (settings: ConnectorSettings, chosen: ConnectorSize): ConnectorSettings => ({
  ...settings,
  kind: chosen.kind,
  width: chosen.width,
  depth: chosen.depth,
});

/** Deepest mortise at `fromPoint` from an acute point that still leaves the shop's cover; none below 0. */
export function deepestMortise(fromPoint: number, angle: number, { width, cover }: ConnectorSettings): number {
  const across = (fromPoint - width / 2) * Math.sin(angle) - cover;
  const slope = Math.max(0, Math.cos(angle));
  if (across <= 0) return 0;
  return slope === 0 ? Infinity : across / slope;
}
