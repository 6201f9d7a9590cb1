import type { FindingCode } from './codes';
import type { Finding, FindingPlace } from './types';

/** A finding with its key: the code and the place, so that the same fact keeps its key across edits. */
export function finding(fact: Omit<Finding, 'key' | 'code'> & { readonly code: FindingCode }): Finding {
  return { key: `${fact.code}:${placeKey(fact.at)}`, ...fact };
}

function placeKey(at: FindingPlace): string {
  const parts = [
    at.run && `run ${at.run}`,
    at.joint && `joint ${at.joint.join('-')}`,
    at.seam && `seam ${at.seam.on}@${Math.round(at.seam.at)}`,
    at.cutout && `cutout ${at.cutout}`,
    at.corner && `corner ${at.corner.join('-')}`,
    at.wall && `wall ${at.wall}`,
    at.base && `base ${at.base}`,
    at.slab && `slab ${at.slab}`,
    at.detail,
  ].filter(Boolean);
  return (parts.length > 0 ? parts : (at.pieces ?? [])).join(' ');
}
