import { demoStockOf } from './demo-stock';

/** A potter's galley of white oak: two straight tops face to face in a closed room, one along a bowed wall. */
export const KILN_LANE_GALLEY = {
  format: 'offsquare-job',
  version: 1,
  name: "Kiln Lane potter's galley",
  units: 'in',
  step: '1/16',
  room: {
    closed: true,
    walls: [
      { id: 'A', length: '124 5/8' },
      { id: 'B', length: '92 3/16' },
      {
        id: 'C',
        length: '123 7/8',
        profile: [
          { at: 0, off: 0 },
          { at: 30, off: 0.1875 },
          { at: 62, off: 0.25 },
          { at: 94, off: 0.125 },
          { at: 123.875, off: 0 },
        ],
      },
      { id: 'D', length: '92 5/8' },
    ],
    corners: [
      { between: ['A', 'B'], nominal: 90, triangle: { a: 36, b: 48, c: '60 3/8' } },
      { between: ['B', 'C'], nominal: 90, triangle: { a: 36, b: 48, c: '59 3/4' } },
    ],
    ties: [
      { id: 't1', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' }, length: '155 7/8' },
      { id: 't2', from: { wall: 'B', at: 0 }, to: { wall: 'C', at: 'end' }, length: '153 13/16' },
    ],
  },
  bases: [
    { id: 'b1', wall: 'A', from: 0, to: 48, kind: 'cabinet' },
    { id: 'b2', wall: 'A', from: 48, to: 84, kind: 'sink base' },
    { id: 'b3', wall: 'A', from: 84, to: 'end', kind: 'cabinet' },
    { id: 'b4', wall: 'B', from: 28, to: 64, kind: 'window', sill: 8, depth: 0 },
    { id: 'b5', wall: 'C', from: 0, to: 72, kind: 'cabinet' },
    { id: 'b6', wall: 'C', from: 72, to: 102, kind: 'range' },
    { id: 'b7', wall: 'D', from: 30, to: 62, kind: 'opening', depth: 0 },
  ],
  runs: [
    {
      id: '1',
      wall: 'A',
      depth: 25,
      left: { kind: 'wall', clearance: 0.125 },
      right: { kind: 'wall', clearance: 0.125 },
    },
    {
      id: '2',
      wall: 'C',
      from: 0,
      to: 72,
      depth: 25,
      left: { kind: 'wall', clearance: 0.125 },
      right: { kind: 'appliance', overhang: -0.125 },
    },
  ],
  cutouts: [
    {
      id: 'c1',
      on: '1',
      kind: 'sink',
      mount: 'drop-in',
      centre: 66,
      setback: 2.5,
      width: 31,
      depth: 19,
      radius: 1,
      label: 'clay sink',
    },
  ],
  material: { species: 'white oak', thickness: 1.5, slabDepth: 25, stave: 1.75, faces: 'both', grain: 'mixed' },
  access: { doorWidth: 31, doorHeight: 79, corridor: null, clearLength: null, crew: 4 },
  finish: { kind: 'oil', coats: 4 },
  stock: demoStockOf('white oak'),
} as const;
