import { area } from '@/geometry/core/polygon';
import { piecesDrawing, topsDrawing } from '@/geometry/export/plan-drawings';
import { writeDxf } from '@/geometry/export/write-dxf';
import { alderJob, type Job } from '../scene/alder-job';
import { readDxf } from './read-dxf';
import { roundJob } from './round-job';

/** Inches and square inches: what a file may lose. */
const CLOSE = 6;
const INCH = 1;

const jobs: readonly (readonly [string, () => Job])[] = [
  ['a U of three walls', alderJob],
  ['round corners, round holes, an island', roundJob],
];

/** Square inches that rounding a square corner takes off. */
const corner = (radius: number) => (1 - Math.PI / 4) * radius * radius;

describe.each(jobs)('DXF of %s, read back by another package', (_name, make) => {
  const { plan, layout } = make();
  const tops = readDxf(writeDxf(topsDrawing(plan, 'Job')));
  const pieces = readDxf(writeDxf(piecesDrawing(plan, layout, 'Job')));

  it('is of the open version 2000 and in inches', () => {
    for (const file of [tops, pieces]) expect([file.version, file.units]).toEqual(['AC1015', INCH]);
  });

  it('has its layers, and everything lies on one of them', () => {
    for (const file of [tops, pieces]) {
      expect(file.layers).toEqual(expect.arrayContaining(['WALLS', 'PIECES', 'CUTOUTS', 'JOINTS', 'SEAMS', 'LETTERS']));
      for (const shape of file.shapes) expect(file.layers).toContain(shape.layer);
    }
    const on = (layer: string) => tops.shapes.filter((shape) => shape.layer === layer).length;
    expect([on('PIECES'), on('CUTOUTS'), on('JOINTS'), on('SEAMS'), on('WALLS')]).toEqual(
      [plan.pieces.length, plan.cutouts.length, plan.joints.length, plan.seams.length, 1], // prettier-ignore
    );
  });

  it('closes every outline and names every piece', () => {
    for (const shape of [...tops.shapes, ...pieces.shapes]) {
      expect(shape.closed).toBe(['PIECES', 'CUTOUTS'].includes(shape.layer));
    }
    expect([...tops.texts].sort()).toEqual(plan.pieces.map((piece) => piece.letter).sort());
  });

  it('gives each piece the area of the plan less its round corners, in the room and on the slab', () => {
    for (const file of [tops, pieces]) {
      const outlines = file.shapes.filter((shape) => shape.layer === 'PIECES');
      plan.pieces.forEach((piece, i) => {
        const rounded = outlines[i]!.radii.reduce((sum, radius) => sum + corner(radius), 0);
        expect(outlines[i]!.area + rounded).toBeCloseTo(piece.area, CLOSE);
      });
    }
  });
});

describe('arcs', () => {
  const { plan, layout } = roundJob();
  const tops = readDxf(writeDxf(topsDrawing(plan, 'Job')));
  const pieces = readDxf(writeDxf(piecesDrawing(plan, layout, 'Job')));

  it('come out with the radius typed: open ends, island, sink, tap hole', () => {
    const radii = (layer: string) => tops.shapes.filter((s) => s.layer === layer).flatMap((s) => s.radii);
    const outer = radii('PIECES').sort((a, b) => a - b);
    expect(outer).toHaveLength(6);
    [1.5, 1.5, 3, 3, 3, 3].forEach((radius, i) => expect(outer[i]).toBeCloseTo(radius, CLOSE));
    const inner = radii('CUTOUTS').sort((a, b) => a - b);
    expect(inner).toHaveLength(5);
    [0.6875, 0.75, 0.75, 0.75, 0.75].forEach((radius, i) => expect(inner[i]).toBeCloseTo(radius, CLOSE));
  });

  it('give a cutout its true area, not that of its chords', () => {
    const sink = tops.shapes.find((s) => s.layer === 'CUTOUTS' && s.radii.length === 4)!;
    expect(sink.area).toBeCloseTo(31 * 17 - 4 * corner(0.75), CLOSE);
    expect(sink.area).toBeGreaterThan(area(plan.cutouts[0]!.outline));
  });

  it('stay on both halves of a sink that a seam goes through', () => {
    const halves = pieces.shapes.filter((s) => s.layer === 'CUTOUTS' && s.radii.length === 2);
    expect(halves).toHaveLength(2);
    const together = halves.reduce((sum, half) => sum + half.area, 0);
    expect(together).toBeCloseTo(31 * 17 - 4 * corner(0.75), CLOSE);
  });
});
