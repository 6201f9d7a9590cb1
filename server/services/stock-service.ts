import type { Knex } from 'knex';

import type { ParsedBody, ResponseOf } from '@/shared/contracts/contract';
import {
  wholeSlabSchema,
  type createStock,
  type importStock,
  type StockSlab,
  type updateStock as updateStockContract,
} from '@/shared/contracts/stock';
import { may } from '@/shared/roles/roles';
import { ProblemError } from '../http/problem-error';
import { logAct } from '../repositories/audit-repository';
import {
  deleteStock,
  findStock,
  insertStock,
  isStockCodeTaken,
  listStock,
  updateStock,
  type StockFields,
  type StockRecord,
} from '../repositories/stock-repository';
import type { Actor } from './actor';
import { announce } from './event-hub';
import { inShop, inShopOnce } from './in-shop';
import { readShop } from './read-shop';

/** Slabs that can be bought. */
export class StockService {
  constructor(private readonly db: Knex) {}

  list(actor: Actor): Promise<{ currency: string; slabs: StockSlab[] }> {
    return inShop(this.db, actor, 'stock.see', async (trx) => {
      const { currency } = await readShop(trx);
      const slabs = await listStock(trx);
      return { currency, slabs: slabs.map((slab) => seenBy(actor, slab)) };
    });
  }

  /** @throws ProblemError code_taken */
  create(actor: Actor, fields: ParsedBody<typeof createStock>): Promise<StockSlab> {
    return inShopOnce(this.db, actor, 'stock.edit', async (trx) => {
      await mustBeFree(trx, fields.code);
      const id = await insertStock(trx, actor.shopId, fields);
      await this.changed(trx, actor, 'stock.added', fields.code);
      return seenBy(actor, await mustFind(trx, id));
    });
  }

  /** Adds many; those whose code is taken, by the stock or by one before it, are named and left out. */
  import(actor: Actor, slabs: ParsedBody<typeof importStock>['slabs']): Promise<ResponseOf<typeof importStock>> {
    return inShopOnce(this.db, actor, 'stock.edit', async (trx) => {
      const added: StockSlab[] = [];
      const refused: { index: number; code: string; message: string }[] = [];
      for (const [index, fields] of slabs.entries()) {
        const { code } = fields;
        if (await isStockCodeTaken(trx, code))
          refused.push({ index, code, message: `There is a slab called ${code}.` });
        else added.push(seenBy(actor, await mustFind(trx, await insertStock(trx, actor.shopId, fields))));
      }
      const data = { added: added.length, refused: refused.length };
      await logAct(trx, { shopId: actor.shopId, personId: actor.personId, action: 'stock.imported', data });
      await announce(trx, actor.shopId, { kind: 'stock' });
      return { added, refused };
    });
  }

  /** Takes many out of the list. */
  remove(actor: Actor, ids: readonly string[]): Promise<{ removed: number }> {
    return inShop(this.db, actor, 'stock.edit', async (trx) => {
      let removed = 0;
      for (const id of ids) if (await deleteStock(trx, id)) removed++;
      await logAct(trx, { shopId: actor.shopId, personId: actor.personId, action: 'stock.removed', data: { removed } });
      await announce(trx, actor.shopId, { kind: 'stock' });
      return { removed };
    });
  }

  /** @throws ProblemError not_found; code_taken; validation_failed when the slab would make no sense */
  update(actor: Actor, slabId: string, change: ParsedBody<typeof updateStockContract>): Promise<StockSlab> {
    return inShop(this.db, actor, 'stock.edit', async (trx) => {
      const { id: _id, ...before } = await mustFind(trx, slabId);
      const given = Object.fromEntries(Object.entries(change).filter(([, value]) => value !== undefined));
      mustMakeSense({ ...before, ...given });
      if (change.code !== undefined) await mustBeFree(trx, change.code, slabId);
      await updateStock(trx, slabId, given as Partial<StockFields>);
      await this.changed(trx, actor, 'stock.changed', change.code ?? before.code);
      return seenBy(actor, await mustFind(trx, slabId));
    });
  }

  /** @throws ProblemError not_found */
  delete(actor: Actor, slabId: string): Promise<void> {
    return inShop(this.db, actor, 'stock.edit', async (trx) => {
      const { code } = await mustFind(trx, slabId);
      await deleteStock(trx, slabId);
      await this.changed(trx, actor, 'stock.removed', code);
    });
  }

  private async changed(trx: Knex.Transaction, actor: Actor, action: string, code: string): Promise<void> {
    await logAct(trx, { shopId: actor.shopId, personId: actor.personId, action, data: { code } });
    await announce(trx, actor.shopId, { kind: 'stock' });
  }
}

function seenBy(actor: Actor, slab: StockRecord): StockSlab {
  return { ...slab, priceCents: may(actor.role, 'price.see') ? slab.priceCents : null };
}

async function mustFind(trx: Knex.Transaction, slabId: string): Promise<StockRecord> {
  const slab = await findStock(trx, slabId);
  if (!slab) throw new ProblemError('not_found', 'There is no such slab in the stock.');
  return slab;
}

async function mustBeFree(trx: Knex.Transaction, code: string, exceptId?: string): Promise<void> {
  if (!(await isStockCodeTaken(trx, code, exceptId))) return;
  throw new ProblemError('code_taken', `There is a slab called ${code} already. Give this one another name.`, {
    issues: [{ path: 'body.code', message: 'is taken' }],
  });
}

function mustMakeSense(slab: StockFields): void {
  const checked = wholeSlabSchema.safeParse(slab);
  if (checked.success) return;
  throw new ProblemError('validation_failed', 'With this change the slab makes no sense. Nothing was changed.', {
    issues: checked.error.issues.map(({ path, message }) => ({ path: ['body', ...path].join('.'), message })),
  });
}
