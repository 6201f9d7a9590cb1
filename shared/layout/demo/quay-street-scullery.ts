import { demoStockOf } from './demo-stock';

/**
 * A U of hard maple with both corners off square (about 91.05 and 88.55 degrees) and a middle run longer than any slab,
 * so that a seam falls at the sink.
 */
export const QUAY_STREET_SCULLERY = {
  format: 'offsquare-job',
  version: 1,
  name: 'Quay Street scullery',
  units: 'in',
  step: '1/16',
  room: {
    closed: false,
    walls: [
      { id: 'A', length: '98 1/4' },
      { id: 'B', length: '148 7/16' },
      { id: 'C', length: '86 1/16' },
    ],
    corners: [
      { between: ['A', 'B'], nominal: 90, triangle: { a: 36, b: 48, c: '60 1/2' } },
      { between: ['B', 'C'], nominal: 90, triangle: { a: 36, b: 48, c: '59 1/4' } },
    ],
    ties: [
      { id: 't1', from: { wall: 'A', at: 0 }, to: { wall: 'C', at: 'end' }, length: '148 9/16' },
      { id: 't2', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' }, length: '179 1/2' },
      { id: 't3', from: { wall: 'B', at: 0 }, to: { wall: 'C', at: 'end' }, length: '169 11/16' },
    ],
  },
  bases: [
    { id: 'b1', wall: 'A', from: 14, to: 62, kind: 'cabinet' },
    { id: 'b2', wall: 'A', from: 62, to: 'end', kind: 'corner base' },
    { id: 'b3', wall: 'B', from: 36, to: 57, kind: 'cabinet' },
    { id: 'b4', wall: 'B', from: 57, to: 93, kind: 'sink base' },
    { id: 'b5', wall: 'B', from: 93, to: 117, kind: 'dishwasher' },
    { id: 'b6', wall: 'C', from: 36, to: 56, kind: 'cabinet' },
    { id: 'b7', wall: 'C', from: 56, to: 86, kind: 'range' },
  ],
  runs: [
    {
      id: '1',
      wall: 'A',
      from: 14,
      to: 'end',
      depth: 25,
      left: { kind: 'open', overhang: 1, radius: 1 },
      right: { kind: 'joint' },
    },
    { id: '2', wall: 'B', from: 0, to: 'end', depth: 25, left: { kind: 'joint' }, right: { kind: 'joint' } },
    {
      id: '3',
      wall: 'C',
      from: 0,
      to: 56,
      depth: 25,
      left: { kind: 'joint' },
      right: { kind: 'appliance', overhang: -0.125 },
    },
  ],
  joints: [
    { between: ['1', '2'], kind: 'miter', assembled: 'site' },
    { between: ['2', '3'], kind: 'miter', assembled: 'site' },
  ],
  cutouts: [
    {
      id: 'c1',
      on: '2',
      kind: 'sink',
      mount: 'undermount',
      centre: 75,
      setback: 3,
      width: 30,
      depth: 17,
      radius: 0.75,
      label: 'sink',
    },
  ],
  material: { species: 'hard maple', thickness: 1.5, slabDepth: 25, stave: 1.75, faces: 'both', grain: 'mixed' },
  access: { doorWidth: 32, doorHeight: 80, corridor: [40, 40], clearLength: 120, crew: 3 },
  finish: { kind: 'oil', coats: 3, foodPrep: true },
  stock: demoStockOf('hard maple'),
} as const;
