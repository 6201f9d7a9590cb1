import { readFileSync } from 'node:fs';
import path from 'node:path';

import { hash } from 'bcryptjs';
import type { Knex } from 'knex';

interface SignIn {
  readonly role: string;
  readonly email: string;
  readonly password: string;
}

interface DemoJob {
  readonly name: string;
  readonly doc: object;
  readonly thumbnail: object;
}

interface DemoSlab {
  readonly id: string;
  readonly species: string;
  readonly thickness: number;
  readonly length: number;
  readonly depth: number;
  readonly price: number;
  readonly count?: number | null;
  readonly faces: string;
  readonly defects?: readonly object[];
}

const NAMES: Readonly<Record<string, string>> = {
  owner: 'Maren Tolliver',
  designer: 'Ilse Brandvold',
  installer: 'Tobias Fennimar',
  shop_hand: 'Odile Karrasch',
};

/** As strong as the server's own. */
const PASSWORD_COST = 11;

/** `days` from today are when the job is measured, cut and fitted. */
const JOBS = [
  {
    file: 'quay-street-scullery',
    customer: 'Petra Hollings',
    address: '14 Quay Street, Carrow Quay',
    stages: ['measured', 'drawn'],
    days: [-6, 9, 16],
  },
  {
    file: 'harbour-bakery-counter',
    customer: 'Harbour Bakery, Anselm Rook',
    address: '2 Harbour Parade, Carrow Quay',
    stages: ['measured', 'drawn'],
    days: [-4, 12, 20],
  },
  {
    file: 'kiln-lane-galley',
    customer: 'Wenna Sarle',
    address: '7 Kiln Lane, Carrow Quay',
    stages: ['measured'],
    days: [-1, 19, 27],
  },
  {
    file: 'lantern-row-island',
    customer: 'Jory and Minna Vask',
    address: '31 Lantern Row, Carrow Quay',
    stages: ['measured'],
    days: [0, 23, 30],
  },
] as const;

/** Fills an empty database with the demo shop: four people, slabs, offcuts and four jobs that can be solved to the end. */
export async function seed(knex: Knex): Promise<void> {
  const signIns = read<SignIn[]>('demo-sign-ins.json');
  await knex.transaction(async (trx) => {
    const shopId = await insertOne(trx, 'shops', {
      name: 'Carrow Quay Tops',
      // What the shop changed; everything else is the program's default.
      settings: '{}',
      letterhead: JSON.stringify({ lines: ['Carrow Quay Tops', '3 Slipway Yard', 'Carrow Quay'] }),
      next_job_number: JOBS.length + 1,
    });
    const crew = await insertCrew(trx, shopId, signIns);
    await insertStock(trx, shopId, crew);
    for (const [index, job] of JOBS.entries()) await insertJob(trx, shopId, crew, job, index + 1);
  });
}

type Crew = ReadonlyMap<string, string>;

/** Role to person. */
async function insertCrew(trx: Knex.Transaction, shopId: string, signIns: readonly SignIn[]): Promise<Crew> {
  const crew = new Map<string, string>();
  const hashes = new Map<string, string>();
  for (const { role, email, password } of signIns) {
    const passwordHash = hashes.get(password) ?? (await hash(password, PASSWORD_COST));
    hashes.set(password, passwordHash);
    const personId = await insertOne(trx, 'people', { email, name: NAMES[role] ?? role, password_hash: passwordHash });
    await trx('memberships').insert({ shop_id: shopId, person_id: personId, role });
    crew.set(role, personId);
  }
  return crew;
}

async function insertStock(trx: Knex.Transaction, shopId: string, crew: Crew): Promise<void> {
  const { slabs, rack } = read<{ slabs: DemoSlab[]; rack: DemoSlab[] }>('demo/stock.json');
  await trx('stock_slabs').insert(
    slabs.map((slab) => ({ ...wood(shopId, slab), count: slab.count, supplier: 'Gannet Point Hardwoods' })),
  );
  await trx('rack_pieces').insert(
    rack.map((piece) => ({ ...wood(shopId, piece), place: 'Left bay', person_id: crew.get('shop_hand') })),
  );
}

function wood(shopId: string, slab: DemoSlab) {
  return {
    shop_id: shopId,
    code: slab.id,
    species: slab.species,
    thickness: slab.thickness,
    length: slab.length,
    depth: slab.depth,
    faces: slab.faces,
    price_cents: slab.price,
    defects: JSON.stringify(slab.defects ?? []),
  };
}

async function insertJob(
  trx: Knex.Transaction,
  shopId: string,
  crew: Crew,
  job: (typeof JOBS)[number],
  number: number,
): Promise<void> {
  const { name, doc, thumbnail } = read<DemoJob>(`demo/${job.file}.json`);
  const stage = job.stages[job.stages.length - 1];
  const jobId = await insertOne(trx, 'jobs', {
    shop_id: shopId,
    number,
    name,
    customer_name: job.customer,
    site_address: job.address,
    stage,
    measure_on: trx.raw('current_date + ?::int', [job.days[0]]),
    cut_on: trx.raw('current_date + ?::int', [job.days[1]]),
    fit_on: trx.raw('current_date + ?::int', [job.days[2]]),
    installer_id: crew.get('installer'),
    designer_id: crew.get('designer'),
    shop_hand_id: crew.get('shop_hand'),
    // The list shows the first job on top.
    updated_at: trx.raw('now() - make_interval(mins => ?)', [number]),
  });
  await trx('layouts').insert({
    shop_id: shopId,
    job_id: jobId,
    doc: JSON.stringify(doc),
    thumbnail: JSON.stringify(thumbnail),
  });
  await trx('audit_log').insert(acts(job.stages).map((act) => ({ shop_id: shopId, job_id: jobId, ...act })));

  function acts(stages: readonly string[]) {
    const by = crew.get('installer');
    const moved = stages.map((to, index) => ({
      person_id: by,
      action: 'job.stage_moved',
      data: JSON.stringify({ from: stages[index - 1] ?? 'new', to }),
      created_at: trx.raw('now() - make_interval(hours => ?)', [stages.length - index]),
    }));
    const created = trx.raw('now() - make_interval(days => 7)');
    return [{ person_id: by, action: 'job.created', data: JSON.stringify({ number }), created_at: created }, ...moved];
  }
}

async function insertOne(trx: Knex.Transaction, table: string, row: object): Promise<string> {
  const [inserted] = await trx(table).insert(row).returning<{ id: string }[]>('id');
  if (!inserted) throw new Error(`insert into ${table} returned no row`);
  return inserted.id;
}

function read<T>(file: string): T {
  return JSON.parse(readFileSync(path.join(__dirname, file), 'utf8')) as T;
}
