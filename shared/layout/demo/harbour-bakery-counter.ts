import { demoStockOf } from './demo-stock';

/** A cherry counter that follows a wall into a three-sided bay and out again: four joints near 135 and 225 degrees. */
export const HARBOUR_BAKERY_COUNTER = {
  format: 'offsquare-job',
  version: 1,
  name: 'Harbour Bakery counter',
  units: 'in',
  step: '1/16',
  room: {
    closed: false,
    walls: [
      { id: 'A', length: '104 5/16' },
      { id: 'B', length: '34 1/8' },
      { id: 'C', length: '58 3/8' },
      { id: 'D', length: '33 7/8' },
      { id: 'E', length: '62 3/16' },
    ],
    corners: [
      { between: ['A', 'B'], nominal: 225, angle: 225.6 },
      { between: ['B', 'C'], nominal: 135, triangle: { a: 24, b: 24, c: '44 1/4' } },
      { between: ['C', 'D'], nominal: 135, triangle: { a: 24, b: 24, c: '44 7/16' } },
      { between: ['D', 'E'], nominal: 225, angle: 224.5 },
    ],
    ties: [
      { id: 't1', from: { wall: 'B', at: 0 }, to: { wall: 'D', at: 'end' }, length: '106 3/8' },
      { id: 't2', from: { wall: 'B', at: 0 }, to: { wall: 'C', at: 'end' }, length: '85 3/4' },
      { id: 't3', from: { wall: 'C', at: 0 }, to: { wall: 'D', at: 'end' }, length: '85 7/8' },
    ],
  },
  bases: [
    { id: 'b1', wall: 'A', from: 30, to: 102, kind: 'cabinet' },
    { id: 'b2', wall: 'C', from: 4, to: 54, kind: 'cabinet' },
    { id: 'b3', wall: 'C', from: 4, to: 54, kind: 'window', sill: 9, depth: 0 },
    { id: 'b4', wall: 'E', from: 6, to: 48, kind: 'cabinet' },
  ],
  runs: [
    {
      id: '1',
      wall: 'A',
      from: 30,
      to: 'end',
      depth: 25,
      left: { kind: 'open', overhang: 1, radius: 1 },
      right: { kind: 'joint' },
    },
    { id: '2', wall: 'B', depth: 25, left: { kind: 'joint' }, right: { kind: 'joint' } },
    { id: '3', wall: 'C', depth: 25, left: { kind: 'joint' }, right: { kind: 'joint' } },
    { id: '4', wall: 'D', depth: 25, left: { kind: 'joint' }, right: { kind: 'joint' } },
    {
      id: '5',
      wall: 'E',
      from: 0,
      to: 48,
      depth: 25,
      left: { kind: 'joint' },
      right: { kind: 'open', overhang: 1, radius: 1 },
    },
  ],
  joints: [
    { between: ['1', '2'], kind: 'miter', assembled: 'site' },
    { between: ['2', '3'], kind: 'miter', assembled: 'shop' },
    { between: ['3', '4'], kind: 'miter', assembled: 'shop' },
    { between: ['4', '5'], kind: 'miter', assembled: 'site' },
  ],
  material: { species: 'cherry', thickness: 1.5, slabDepth: 25, stave: 2, faces: 'both', grain: 'mixed' },
  access: { doorWidth: 42, doorHeight: 84, corridor: null, clearLength: null, crew: 2 },
  finish: { kind: 'hard wax', coats: 2, foodPrep: true },
  stock: demoStockOf('cherry'),
} as const;
