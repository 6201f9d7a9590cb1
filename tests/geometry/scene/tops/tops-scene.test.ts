import type { DrawItem, Scene } from '@/geometry/scene/display-list';
import { letterPlace, roomAt } from '@/geometry/scene/tops/letter-place';
import { splitAt } from '@/geometry/scene/tops/draw-joints';
import { inkOnWood, toRoom } from '@/geometry/scene/tops/draw-pieces';
import { thumbnailScene } from '@/geometry/scene/tops/thumbnail-scene';
import { topsScene } from '@/geometry/scene/tops/tops-scene';
import type { Polygon } from '@/geometry/core/point';
import { contains } from '@/geometry/core/polygon';

import { sharedMiterJob } from '../alder-job';

const { plan, layout } = sharedMiterJob();

const of = <K extends DrawItem['kind']>(scene: Scene, kind: K, layer: DrawItem['layer']) =>
  scene.items.filter((item): item is Extract<DrawItem, { kind: K }> => item.kind === kind && item.layer === layer);

describe('topsScene', () => {
  const scene = topsScene(plan, layout);

  it('lays staves along each piece’s own grain, so that they turn at the miters', () => {
    const staves = of(scene, 'staves', 'staves');
    expect(staves.map((item) => item.id)).toEqual(plan.pieces.map((piece) => piece.letter));
    const [q, r] = ['Q', 'R'].map((id) => staves.find((item) => item.id === id)!);
    const turn = Math.acos(q!.along[0] * r!.along[0] + q!.along[1] * r!.along[1]);
    const corner = plan.joints[0]!.corner;
    expect((turn * 180) / Math.PI).toBeCloseTo(180 - corner, 6);
  });

  it('puts each letter inside its own piece and clear of the sink', () => {
    for (const disc of of(scene, 'mark', 'letters').filter((mark) => mark.mark === 'disc')) {
      const piece = plan.pieces.find((p) => p.letter === disc.id)!;
      expect(contains(piece.outline, disc.at)).toBe(true);
      expect(plan.cutouts.some((cutout) => contains(cutout.outline, disc.at))).toBe(false);
    }
  });

  it('draws the seam solid where it shows and dotted in the sink; the solid parts are as long as the plan says', () => {
    const lines = of(scene, 'line', 'seams');
    const length = (dotted: boolean) =>
      lines
        .filter((line) => (line.stroke.dash !== undefined) === dotted)
        .reduce((sum, { from, to }) => sum + Math.hypot(to[0] - from[0], to[1] - from[1]), 0);
    const seam = plan.seams[0]!;
    expect(length(false)).toBeCloseTo(seam.visible, 6);
    expect(length(true)).toBeCloseTo(25 - seam.visible, 6);
  });

  it('draws each joint from its back corner to its front corner', () => {
    const joints = of(scene, 'line', 'joints');
    joints.forEach((line, i) => {
      const length = Math.hypot(line.to[0] - line.from[0], line.to[1] - line.from[1]);
      expect(length).toBeCloseTo(plan.joints[i]!.length, 9);
    });
  });

  it('shows sizes and hardware only when asked', () => {
    expect(of(scene, 'dimension', 'sizes')).toHaveLength(0);
    const full = topsScene(plan, layout, { layers: { sizes: true, hardware: true } });
    const [front, back] = of(full, 'dimension', 'sizes').filter((item) => item.id === 'R');
    const r = plan.pieces.find((piece) => piece.letter === 'R')!;
    expect([front!.inches, back!.inches]).toEqual([r.front, r.back]);
    expect(of(full, 'mark', 'hardware')).toHaveLength(plan.joints.reduce((sum, j) => sum + j.connectors.length, 0));
  });

  it('measures a dimension between the ends it names', () => {
    const full = topsScene(plan, layout, { layers: { sizes: true } });
    for (const { from, to, inches } of of(full, 'dimension', 'sizes')) {
      expect(Math.hypot(to[0] - from[0], to[1] - from[1])).toBeCloseTo(inches, 6);
    }
  });

  it('leaves walls and grain out when their layers are off', () => {
    const bare = topsScene(plan, layout, { layers: { walls: false, grain: false } });
    expect(bare.items.some((item) => item.layer === 'walls' || item.kind === 'staves')).toBe(false);
  });

  it('gives every seam its handle when seams can be slid', () => {
    const handles = of(topsScene(plan, layout, { handles: true }), 'mark', 'seams');
    expect(handles.map((mark) => mark.mark)).toEqual(['handle']);
  });

  it('carries a piece’s own axes into the room exactly', () => {
    for (const piece of plan.pieces) {
      piece.shape.forEach((p) => {
        const [x, y] = toRoom(piece, p);
        const off = Math.min(...piece.outline.map((q) => Math.hypot(q[0] - x, q[1] - y)));
        expect(off).toBeLessThan(1e-6);
      });
    }
  });
});

describe('splitAt', () => {
  it('parts a line at an outline: 2 out, 4 in, 3 out', () => {
    const parts = splitAt([0, 0], [9, 0], [[2, -1], [6, -1], [6, 1], [2, 1]]); // prettier-ignore
    expect(parts.map((p) => [p.to[0] - p.from[0], p.inside])).toEqual([[2, false], [4, true], [3, false]]); // prettier-ignore
  });

  it('leaves a line whole that meets nothing', () => {
    expect(splitAt([0, 0], [9, 0], [])).toEqual([{ from: [0, 0], to: [9, 0], inside: false }]);
  });
});

describe('thumbnailScene', () => {
  it('shows wood for drawn tops and dashes for those nobody has drawn', () => {
    expect(thumbnailScene(plan, layout).items.some((item) => item.kind === 'staves')).toBe(true);
    const dashed = thumbnailScene(plan, layout, { dashed: true });
    expect(dashed.items.every((item) => item.kind === 'polygon' && item.stroke?.dash)).toBe(true);
  });

  it('shows the walls while there are no tops', () => {
    const scene = thumbnailScene({ ...plan, pieces: [] }, layout);
    expect(scene.items).toHaveLength(1);
    expect(scene.items[0]).toMatchObject({ kind: 'polyline', layer: 'walls' });
    expect(scene.alt).toBe('3 walls, no tops yet');
  });
});

describe('letterPlace', () => {
  const rectangle: Polygon = [[0, 0], [60, 0], [60, 25], [0, 25]]; // prettier-ignore

  it('is the middle of a plain piece, and of the longer part beside a sink', () => {
    expect(letterPlace(rectangle, [], 25)).toEqual([30, 12.5]);
    const sink: Polygon = [[10, 3], [34, 3], [34, 20], [10, 20]]; // prettier-ignore
    expect(letterPlace(rectangle, [sink], 25)).toEqual([47, 12.5]);
  });

  it('goes where there is room when the usual place is cramped: the arm of an L beside a cooktop', () => {
    const l: Polygon = [[0, 0], [70, 0], [70, 24], [40, 24], [40, 40], [0, 40]]; // prettier-ignore
    const cooktop: Polygon = [[6, 3], [34, 3], [34, 21], [6, 21]]; // prettier-ignore
    const place = letterPlace(l, [cooktop], 40);
    // A circle of 11 in radius lies in the arm, from 34 to 70 by 0 to 24.
    expect(roomAt(place, l, [cooktop])).toBeGreaterThan(9);
  });

  it('has no room outside the piece or in a cutout', () => {
    expect(roomAt([70, 5], rectangle, [])).toBe(0);
    expect(roomAt([15, 10], rectangle, [[[10, 3], [34, 3], [34, 20], [10, 20]]])).toBe(0); // prettier-ignore
    expect(roomAt([30, 10], rectangle, [])).toBe(10);
  });
});

describe('inkOnWood', () => {
  const of = (species: string) => ({ ...layout, material: { ...layout.material, species } });

  it('keeps lines dark on light wood, whatever the screen; on dark wood and on none they go with the screen', () => {
    expect(inkOnWood(of('hard maple'), true)).toBe('tapeInk');
    expect(inkOnWood(of('black walnut'), true)).toBe('ink');
    expect(inkOnWood(of('hard maple'), false)).toBe('ink');
    const lines = topsScene(plan, of('hard maple')).items.filter((item) => item.layer === 'joints');
    expect(lines.every((item) => item.kind === 'line' && item.stroke.ink === 'tapeInk')).toBe(true);
    expect(lines.length).toBeGreaterThan(0);
  });
});
