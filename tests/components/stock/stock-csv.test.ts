import { readSlab, slabTexts } from '@/components/stock/read-slab';
import { readStockCsv, writeStockCsv } from '@/components/stock/stock-csv';
import type { StockSlab } from '@/shared/contracts/stock';

const HEAD = 'Code,Species,Thickness,Length,Depth,Price,Count,Faces,Supplier,Colour';
const none = new Set<string>();

describe('readStockCsv', () => {
  it('reads lengths as on a tape, prices with signs, quoted texts, and names what it leaves out', () => {
    const text = `${HEAD}\r\nM96,Hard maple,"1 1/2","8' 0""",25,$379.00,6,both,"Quay Street, ""the old mill""",pale\r\n`;
    const { rows, ignored, problem } = readStockCsv(text, false, none);
    expect(problem).toBeNull();
    expect(ignored).toEqual(['colour']);
    expect(rows).toHaveLength(1);
    expect(rows[0]!.errors).toEqual([]);
    expect(rows[0]!.slab).toMatchObject({
      code: 'M96',
      species: 'hard maple',
      thickness: 1.5,
      length: 96,
      depth: 25,
      priceCents: 37_900,
      count: 6,
      faces: 'both',
      supplier: 'Quay Street, "the old mill"',
      trim: null,
    });
  });

  it('names every line that is wrong with its columns, and keeps the others', () => {
    const text = [
      HEAD,
      'A,cherry,1 1/2,96,25,300,,one,,',
      'B,cherry,1 1/2,96,25,-300,,both,,',
      'C,cherry,thick,0,25,300,many,both,,',
      'A,cherry,1 1/2,120,25,400,,both,,',
      ',cherry,1 1/2,96,25,300,,both,,',
    ].join('\n');
    const { rows } = readStockCsv(text, false, new Set(['Z']));
    expect(rows.map((row) => [row.line, row.slab !== null])).toEqual([
      [2, true],
      [3, false],
      [4, false],
      [5, false],
      [6, false],
    ]);
    expect(rows[1]!.errors).toEqual(['price: -300 is negative. A price is never under zero.']);
    expect(rows[2]!.errors.join(' ')).toMatch(/thickness: .*length: This has to be more than nothing\..*count: many/);
    expect(rows[3]!.errors).toEqual(['code: A is taken. Give this one another.']);
    expect(rows[4]!.errors).toEqual(['code: This has to be filled in.']);
  });

  it('takes semicolons and millimeters', () => {
    const text = `code;species;thickness;length;depth;price\nM1;white oak;38;2445;635;420,50`.replace(
      '420,50',
      '420.50',
    );
    const { rows } = readStockCsv(text, true, none);
    expect(rows[0]!.slab).toMatchObject({ thickness: 38 / 25.4, length: 2445 / 25.4, priceCents: 42_050 });
  });

  it.each([
    ['', /has to name the columns/],
    ['a,b\n1,2', /code, species, thickness, length, depth, price are not among them/],
    [HEAD, /no slab in this file/],
    [`${HEAD}\n${'X,cherry,1,96,25,3,,,,\n'.repeat(501)}`, /More than 500 lines/],
  ])('says why nothing of a file can be read', (text, words) => {
    expect(readStockCsv(text, false, none).problem).toMatch(words);
  });

  it('reads back what it writes, to the tape, and writes no formula', () => {
    const slab: StockSlab = {
      id: '5b0c6fd0-0d4f-4a4f-9d43-0f6a2bfb6a10',
      code: 'M120',
      species: 'hard maple',
      thickness: 1.5,
      length: 120,
      depth: 25.0625,
      batch: '=1+1',
      faces: 'one',
      defects: [],
      priceCents: 48_950,
      count: null,
      trim: 0.5,
      measuredDepth: 24.875,
      crook: 0.125,
      straightening: 0.25,
      supplier: 'Harbour sawmill',
    };
    const text = writeStockCsv([slab], false);
    expect(text).toContain(`'=1+1`);
    const [row] = readStockCsv(text, false, none).rows;
    expect(row!.slab).toMatchObject({ ...slabWithout(slab), batch: "'=1+1" });
  });
});

const slabWithout = ({ id: _, ...rest }: StockSlab) => rest;

describe('readSlab', () => {
  const texts = { code: 'S', species: 'beech', thickness: '1 1/2', length: '96', depth: '25', price: '300' };

  it('refuses what would leave no wood, at the field', () => {
    const read = readSlab({ ...texts, trim: '48' }, false);
    expect(read).toEqual({ ok: false, errors: { trim: 'This leaves nothing of the length.' } });
    const straight = readSlab({ ...texts, straightening: '25' }, false);
    expect(straight).toEqual({ ok: false, errors: { straightening: 'This leaves nothing of the depth.' } });
  });

  it('gives back the texts of a slab it read', () => {
    const read = readSlab(texts, false);
    if (!read.ok) throw new Error('it was not read');
    const again = slabTexts({ ...read.slab, id: 'x', priceCents: read.slab.priceCents } as StockSlab, false);
    expect(again).toMatchObject({ code: 'S', thickness: '1 1/2', length: '96', price: '300.00', count: '', trim: '' });
  });
});
