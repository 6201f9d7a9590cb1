import { planJob, type Job } from '../scene/alder-job';

/** A wall with a tap hole, a rounded sink over a seam, an open end with a radius, and a rounded island. */
export const roundJob = (): Job =>
  planJob({
    format: 'offsquare-job',
    version: 1,
    name: 'Net loft, Carrow Quay',
    units: 'in',
    step: '1/16',
    room: {
      closed: false,
      walls: [
        { id: 'A', length: 150, profile: [{ at: 0, off: 0 }, { at: 40, off: 0.4375 }, { at: 90, off: 0.125 }, { at: 150, off: 0 }] }, // prettier-ignore
        { id: 'B', length: 80 },
      ],
      corners: [{ between: ['A', 'B'], nominal: 90, triangle: { a: 36, b: 48, c: '60 1/4' } }],
    },
    bases: [{ id: 'b1', wall: 'A', from: 50, to: 86, kind: 'sink base', depth: 24, access: 'open' }],
    runs: [
      { id: '1', wall: 'A', from: 2, to: 'end', left: { kind: 'open', overhang: 1, radius: 1.5 }, right: { kind: 'joint' } }, // prettier-ignore
      { id: '2', wall: 'B', from: 0, to: 70, left: { kind: 'joint' }, right: { kind: 'open', overhang: 1, radius: 1.5 } }, // prettier-ignore
    ],
    islands: [{ id: 'I', length: 60, depth: 25, shape: 'rounded', corner: 3 }],
    strips: [{ id: 's', label: 'backsplash', length: 60, width: 4, thickness: 0.75, count: 2 }],
    cutouts: [
      { id: 'c1', on: '1', kind: 'sink', centre: 68, setback: 3, width: 31, depth: 17, radius: 0.75 },
      { id: 'c2', on: '1', kind: 'tap', centre: 100, setback: 20, width: 1.375, depth: 1.375, radius: 0 },
    ],
    joints: [{ between: ['1', '2'], kind: 'miter', assembled: 'site' }],
    seams: [{ on: '1', at: 68 }],
    fixing: { rail: 0.75, backsplash: 0 },
    material: { species: 'cherry', thickness: 1.5, slabDepth: 25 },
    stock: {
      slabs: [
        { id: 'C-96', length: 96, depth: 25, price: 43600, count: null },
        { id: 'C-120', length: 120, depth: 25, price: 54500, count: null },
        { id: 'C-60', length: 61, depth: 25, thickness: 0.75, price: 24500, count: null },
      ],
    },
  });
