import type { Layout } from '../core/layout';
import type { ShopSettings } from '../core/settings';
import type { JointWood } from './types';
import type { Tops } from '../top/types';
import { drawboltsAlong } from './drawbolts';
import type { Fastener } from './fasteners';
import { finishSetting } from './finish';
import { finishQuarts, glueArea, glueOunces, sealedArea } from './quantities';

/** What has to be on the bench and in the van. */
export interface MaterialsList {
  /** Square feet of all faces and edges. */
  readonly sealedSqFt: number;
  readonly coats: number;
  readonly finishQuarts: number;
  readonly glueOunces: number;
  readonly screws: number;
  readonly connectors: number;
  readonly drawbolts: number;
}

/**
 * Quantities for a job: the first coat goes on every face and edge, the later ones on the upper face only.
 *
 * @param joints - with their connectors; `fasteners` - of all pieces
 */
export function materialsList(
  layout: Pick<Layout, 'finish' | 'material'>,
  tops: Pick<Tops, 'pieces' | 'joints' | 'seams'>,
  joints: readonly JointWood[],
  fasteners: readonly Fastener[],
  settings: ShopSettings,
): MaterialsList {
  const sealed = tops.pieces.reduce((sum, piece) => sum + sealedArea(piece), 0);
  const faces = tops.pieces.reduce((sum, piece) => sum + piece.netArea * piece.count, 0);
  const finish = finishSetting(layout.finish, settings);
  const later = finish ? Math.max(0, finish.coats - 1) : 0;
  const glue = glueArea(tops.joints, tops.seams, layout.material.thickness);
  const site = tops.joints.filter((joint) => joint.assembled === 'site');
  return {
    sealedSqFt: sealed / 144,
    coats: finish?.coats ?? 0,
    finishQuarts: finish ? finishQuarts(sealed + later * faces, 1, finish.sqFtPerQuart) : 0,
    glueOunces: glueOunces(glue, settings.spread.glueSqFtPerGallon),
    screws: fasteners.length,
    connectors: joints.reduce((sum, joint) => sum + joint.connectors.length, 0),
    drawbolts: site.reduce((sum, joint) => sum + drawboltsAlong(joint.length).length, 0),
  };
}
