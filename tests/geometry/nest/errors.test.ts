import { nest } from '@/geometry/nest/nest';
import type { NestInstance } from '@/geometry/nest/types';
import { instance, rectangle, run, slab } from '@/tests/helpers/nest-builder';

const say = (given: Partial<NestInstance>): string => {
  const answer = nest(instance(given));
  return 'error' in answer ? `${answer.error.path.join('.')}: ${answer.error.message}` : 'a plan';
};

describe('nest refuses in a sentence that says where and what', () => {
  it.each<[string, Partial<NestInstance>, string]>([
    [
      'a part longer than every slab',
      { parts: [run('A', 60), run('P', 130)] },
      'parts.1: Part P fits no slab: it needs one at least 131 in long and 25 in deep.',
    ],
    [
      'a part deeper than every slab',
      { parts: [{ id: 'I', outline: rectangle(72, 39) }] },
      'parts.0: Part I fits no slab: it needs one at least 73 in long and 39 in deep.',
    ],
    [
      'a group longer than every slab',
      { parts: [run('A', 60), run('B', 60)], groups: [{ id: 'g', parts: ['A', 'B'] }] },
      'parts.0: The parts A, B, cut from one slab, fit no slab: they need one at least 121.13 in long and 25 in deep.',
    ],
    [
      'a choice of which no option fits',
      { parts: [run('A', 99), run('B', 98)], choices: [{ id: 'c', options: [['A'], ['B']] }] },
      'parts.0: Part A fits no slab: it needs one at least 100 in long and 25 in deep.',
    ],
    ['no stock', { stock: [] }, 'stock: There are no slabs to cut from: add one to the stock.'],
    ['a negative price', { stock: [slab({ price: -1 })] }, 'stock.0.price: Slab S96: the price is negative.'],
    ['half a cent', { stock: [slab({ price: 0.5 })] }, 'stock.0.price: Slab S96: the price must be whole cents.'],
    [
      'a slab of no length',
      { stock: [slab({ length: 0 })] },
      'stock.0.length: Slab S96: the length must be more than 0.',
    ],
    [
      'half a slab',
      { stock: [slab({ count: 0.5 })] },
      'stock.0.count: Slab S96: the count must be a whole number, 0 or more.',
    ],
    ['two slabs of one name', { stock: [slab(), slab()] }, 'stock.1.id: Two slabs are called S96.'],
    ['a negative kerf', { kerf: -0.1 }, 'kerf: The kerf must be 0 or more.'],
    [
      'a kerf wider than a part',
      { parts: [{ id: 's', outline: rectangle(30, 0.1) }] },
      'parts.0.outline: Part s is 0.1 in wide, no wider than the saw cut of 0.13 in.',
    ],
    [
      'an outline that caves in',
      { parts: [{ id: 'L', outline: [[0, 0], [40, 0], [40, 10], [10, 10], [10, 25], [0, 25]] }] }, // prettier-ignore
      'parts.0.outline: Part L: the outline is not convex.',
    ],
    [
      'an outline without area',
      { parts: [{ id: 'N', outline: [[0, 0], [40, 0], [80, 0]] }] }, // prettier-ignore
      'parts.0.outline: Part N: the outline has no area.',
    ],
    [
      'an outline that is not a number',
      { parts: [{ id: 'N', outline: [[0, 0], [NaN, 0], [80, 20]] }] }, // prettier-ignore
      'parts.0.outline: Part N: a corner of the outline is not a number.',
    ],
    ['two parts of one name', { parts: [run('A', 9), run('A', 8)] }, 'parts.1.id: Two parts are called A.'],
    [
      'a choice of a part that is not listed',
      { parts: [run('A', 9)], choices: [{ id: 'c', options: [['A'], ['B']] }] },
      'choices.0.options.1: Choice c names part B, which is not listed.',
    ],
    [
      'a part in two choices',
      {
        parts: [run('A', 9), run('B', 9)],
        choices: [
          { id: 'c', options: [['A']] },
          { id: 'd', options: [['A'], ['B']] },
        ],
      },
      'choices.1.options.0: Part A is named in two choices (c and d).',
    ],
    [
      'a part in two groups',
      {
        parts: [run('A', 9), run('B', 9)],
        groups: [
          { id: 'g', parts: ['A', 'B'] },
          { id: 'h', parts: ['A'] },
        ],
      },
      'groups.1.parts: Part A is named twice in groups (g and h).',
    ],
    [
      'fewer slabs than the parts need',
      { parts: [run('A', 60), run('B', 60)], stock: [slab({ count: 1 })] },
      'stock: There are not enough slabs for all parts: add stock or raise a count.',
    ],
  ])('%s', (_, given, sentence) => {
    expect(say(given)).toBe(sentence);
  });

  it('gives an empty plan that costs nothing when there is nothing to cut', () => {
    expect(nest(instance())).toMatchObject({ slabs: [], cost: 0, lowerBound: 0, gap: 0, proved: true });
  });

  it('leaves out the option that fits no slab and cuts the other', () => {
    const parts = [run('A', 99), run('B', 50), run('C', 49)];
    const answer = nest(instance({ parts, choices: [{ id: 'c', options: [['A'], ['B', 'C']] }] }));
    expect(answer).toMatchObject({ choices: [{ id: 'c', option: 1 }] });
  });
});
