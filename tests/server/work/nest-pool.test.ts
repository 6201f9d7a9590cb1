import type { NestInstance } from '@/geometry/nest/types';
import { NestBusyError, NestPool } from '@/server/work/nest-pool';

const part = (id: string, length: number) => ({
  id,
  outline: [
    [0, 0],
    [length, 0],
    [length, 25],
    [0, 25],
  ] as const,
});

const INSTANCE: NestInstance = {
  id: 'two runs',
  kerf: 0.125,
  trim: 0.5,
  reuseMin: 18,
  stock: [{ id: 'S96', length: 96, depth: 25, price: 37_900, count: null }],
  parts: [part('P', 50), part('Q', 40)],
};

const never = () => new AbortController().signal;

describe('NestPool', () => {
  it('searches in a thread of its own and gives the plan', async () => {
    const plan = await new NestPool().run(INSTANCE, 1000, never());

    // 50 + 40 + a kerf and two trims of 1/2 in fit 96 in: one slab, and no plan has fewer.
    expect(plan).toMatchObject({ cost: 37_900, lowerBound: 37_900, proved: true });
  });

  it('hands on why there is no plan', async () => {
    const answer = await new NestPool().run({ ...INSTANCE, parts: [part('P', 120)] }, 1000, never());

    expect(answer).toMatchObject({ error: { code: 'part_fits_no_slab' } });
  });

  it('leaves the thread of requests free while it searches', async () => {
    let turns = 0;
    const timer = setInterval(() => turns++, 1);
    await new NestPool().run(INSTANCE, 1000, never());
    clearInterval(timer);

    expect(turns).toBeGreaterThan(0);
  });

  it('ends a search, and one that waits, when nobody wants the answer any more', async () => {
    const pool = new NestPool();
    const gone = new AbortController();
    const searches = [1, 2, 3, 4].map(() => pool.run(INSTANCE, 1000, gone.signal));
    gone.abort(new Error('the caller has gone'));

    const ends = await Promise.allSettled(searches);
    expect(ends.map(({ status }) => status)).toEqual(['rejected', 'rejected', 'rejected', 'rejected']);
    // The places are free again.
    await expect(pool.run(INSTANCE, 1000, never())).resolves.toMatchObject({ proved: true });
    await expect(pool.run(INSTANCE, 1000, gone.signal)).rejects.toThrow('the caller has gone');
  });

  it('lets 2 run and 16 wait, and turns the next away', async () => {
    const pool = new NestPool();
    const ends = Array.from({ length: 18 }, () => new AbortController());
    const accepted = ends.map((end) => pool.run(INSTANCE, 1000, end.signal).catch(() => null));

    await expect(pool.run(INSTANCE, 1000, never())).rejects.toBeInstanceOf(NestBusyError);
    for (const end of ends) end.abort(new Error('enough'));
    await Promise.all(accepted);
  });
});
