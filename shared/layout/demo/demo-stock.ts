/**
 * What the demo shop can cut from: slabs to buy in four woods and offcuts on its rack, all 1 1/2 in thick. Lengths
 * inches, prices cents. Sizes and prices are invented.
 */
const THICKNESS = 1.5;

const slab = (id: string, species: string, length: number, depth: number, price: number) => ({
  id,
  species,
  thickness: THICKNESS,
  length,
  depth,
  price,
  count: null,
  faces: 'both' as const,
});

export const DEMO_SLABS = [
  slab('M72', 'hard maple', 72, 25, 28_900),
  slab('M96', 'hard maple', 96, 25, 37_900),
  slab('M120', 'hard maple', 120, 25, 48_900),
  slab('M84-39', 'hard maple', 84, 39, 56_400),
  slab('W72', 'black walnut', 72, 25, 46_200),
  slab('W96', 'black walnut', 96, 25, 61_500),
  slab('W84-39', 'black walnut', 84, 39, 88_000),
  slab('O72', 'white oak', 72, 25, 33_400),
  slab('O108', 'white oak', 108, 25, 49_900),
  slab('O144', 'white oak', 144, 25, 69_800),
  slab('C96', 'cherry', 96, 25, 43_600),
  slab('C120', 'cherry', 120, 25, 55_200),
];

export const DEMO_RACK = [
  {
    id: 'R1',
    species: 'hard maple',
    thickness: THICKNESS,
    length: 41,
    depth: 25,
    price: 0,
    faces: 'both' as const,
    defects: [{ x: 0, y: 0, w: 3, h: 25 }],
  },
  { id: 'R2', species: 'cherry', thickness: THICKNESS, length: 37.5, depth: 25, price: 0, faces: 'both' as const },
  { id: 'R3', species: 'white oak', thickness: THICKNESS, length: 52.25, depth: 25, price: 0, faces: 'both' as const },
  { id: 'R4', species: 'black walnut', thickness: THICKNESS, length: 29, depth: 25, price: 0, faces: 'both' as const },
];

/** What of it is of one wood, in the words of the job file. */
export function demoStockOf(species: string) {
  return {
    slabs: DEMO_SLABS.filter((one) => one.species === species),
    rack: DEMO_RACK.filter((one) => one.species === species),
    kerf: 0.125,
    trim: 0.5,
    reuseMin: 18,
  };
}
