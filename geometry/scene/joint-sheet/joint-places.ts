import type { ShopSettings } from '../../core/settings';
import { distance } from '../../core/vector';
import type { Plan } from '../../plan/types';
import type { TopSeam } from '../../top/types';
import { seamCleats, type SeamCleats } from '../../wood/cleats';
import { deepestMortise } from '../../wood/connector-sizes';
import { drawboltsAlong } from '../../wood/drawbolts';
import { seamConnectors } from '../../wood/joint-wood';

/** One place where two pieces meet, with all that is marked on its two faces. Inches from the back point. */
export interface JointPlace {
  /** "Miter P to Q", "Seam Q to R" */
  readonly name: string;
  readonly letters: readonly [string, string];
  readonly kind: Plan['joints'][number]['kind'] | 'seam' | 'edge seam';
  readonly length: number;
  /** Degrees between each piece's back edge and the face. */
  readonly angles: readonly [number, number];
  readonly assembled: 'shop' | 'site';
  readonly connectors: readonly { readonly at: number; readonly deepest: number }[];
  readonly bolts: readonly number[];
  readonly cleats: SeamCleats | null;
  /** Stretch that a cutout takes away. */
  readonly gone: readonly [number, number] | null;
  readonly visible: number;
}

const KIND_WORDS = {
  miter: 'Miter',
  butt: 'Butt joint',
  diagonal: 'Diagonal corner',
  square: 'Square seam',
  step: 'Step',
};

/** Every miter, butt, step and seam of the plan, joints first, in the order of the tops. */
export function jointPlaces(plan: Plan, settings: ShopSettings): readonly JointPlace[] {
  const joints = plan.joints.map((joint): JointPlace => ({
    name: `${KIND_WORDS[joint.kind]} ${joint.letters.join(' to ')}`,
    letters: joint.letters,
    kind: joint.kind,
    length: joint.length,
    angles: joint.angles,
    assembled: joint.assembled,
    connectors: joint.connectors.map((at) => withDepth(at, joint, settings)),
    bolts: joint.assembled === 'site' ? drawboltsAlong(joint.length) : [],
    cleats: null,
    gone: null,
    visible: joint.length,
  }));
  return [...joints, ...plan.seams.map((seam) => seamPlace(seam, plan, settings))];
}

function seamPlace(seam: TopSeam, plan: Plan, settings: ShopSettings): JointPlace {
  const length = distance(seam.from, seam.to);
  const cutout = plan.cutouts.find((one) => one.id === seam.inCutout);
  const face = { length, angles: [90, 90] as const };
  return {
    name: `${seam.edge ? 'Edge seam' : 'Seam'} ${seam.letters.join(' to ')}`,
    letters: seam.letters,
    kind: seam.edge ? 'edge seam' : 'seam',
    ...face,
    assembled: seam.edge ? 'shop' : 'site',
    connectors: seamConnectors(seam, plan.tops, settings).map((at) => withDepth(at, face, settings)),
    bolts: cutout || seam.edge ? [] : drawboltsAlong(length),
    cleats: cutout ? seamCleats(seam, cutout) : null,
    gone: cutout ? [cutout.backStrip, length - cutout.frontStrip] : null,
    visible: seam.visible,
  };
}

/** A connector with the deepest mortise that both pieces allow there. */
function withDepth(
  at: number,
  { length, angles }: { readonly length: number; readonly angles: readonly [number, number] },
  settings: ShopSettings,
) {
  const radians = (degrees: number) => (degrees * Math.PI) / 180;
  const each = angles.flatMap((angle) => [
    deepestMortise(at, radians(angle), settings.connectors),
    deepestMortise(length - at, radians(180 - angle), settings.connectors),
  ]);
  return { at, deepest: Math.min(settings.connectors.depth, ...each) };
}
