import { demoStockOf } from './demo-stock';

/** A row house: a top of black walnut from wall to wall with a cooktop, and an island in front of it with a small sink. */
export const LANTERN_ROW_ISLAND = {
  format: 'offsquare-job',
  version: 1,
  name: 'Lantern Row island',
  units: 'in',
  step: '1/16',
  room: {
    closed: false,
    walls: [
      { id: 'A', length: '118 1/8' },
      { id: 'B', length: '131 5/16' },
      { id: 'C', length: '120 3/8' },
    ],
    corners: [
      { between: ['A', 'B'], nominal: 90, triangle: { a: 36, b: 48, c: '59 5/8' } },
      { between: ['B', 'C'], nominal: 90, triangle: { a: 36, b: 48, c: '60 3/16' } },
    ],
    ties: [
      { id: 't1', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' }, length: '175 1/2' },
      { id: 't2', from: { wall: 'B', at: 0 }, to: { wall: 'C', at: 'end' }, length: '178 3/4' },
    ],
  },
  bases: [
    { id: 'b1', wall: 'B', from: 0, to: 48, kind: 'cabinet' },
    { id: 'b2', wall: 'B', from: 48, to: 84, kind: 'cabinet', label: 'cooktop base' },
    { id: 'b3', wall: 'B', from: 84, to: 'end', kind: 'cabinet' },
  ],
  runs: [
    {
      id: '1',
      wall: 'B',
      depth: 25,
      left: { kind: 'wall', clearance: 0.25 },
      right: { kind: 'wall', clearance: 0.25 },
    },
  ],
  islands: [{ id: 'I', length: 76, depth: 38, at: [14, -28], bearing: -90.7, shape: 'rounded', corner: 1.5 }],
  cutouts: [
    { id: 'c1', on: '1', kind: 'cooktop', centre: 66, setback: 2.5, width: 29, depth: 19.5, radius: 0.5 },
    {
      id: 'c2',
      on: 'I',
      kind: 'sink',
      mount: 'undermount',
      centre: 20,
      setback: 5,
      width: 15,
      depth: 15,
      radius: 0.75,
      label: 'prep sink',
    },
  ],
  material: { species: 'black walnut', thickness: 1.5, slabDepth: 25, stave: 2, faces: 'both', grain: 'mixed' },
  access: { doorWidth: 34, doorHeight: 80, corridor: [36, 42], clearLength: 108, crew: 3 },
  edges: { profile: 'chamfer', size: 0.125 },
  finish: { kind: 'hard wax', coats: 2 },
  stock: demoStockOf('black walnut'),
} as const;
