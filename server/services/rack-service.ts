import type { Knex } from 'knex';

import type { ParsedBody } from '@/shared/contracts/contract';
import type { createRackPiece, RackPiece } from '@/shared/contracts/rack';
import { ProblemError } from '../http/problem-error';
import { logAct } from '../repositories/audit-repository';
import { findJob } from '../repositories/job-repository';
import {
  findRackPiece,
  insertRackPiece,
  listRack,
  takeRackCode,
  type RackRecord,
} from '../repositories/rack-repository';
import type { Actor } from './actor';
import { announce } from './event-hub';
import { inShop, inShopOnce } from './in-shop';

/** Offcuts on the rack. */
export class RackService {
  constructor(private readonly db: Knex) {}

  list(actor: Actor): Promise<{ pieces: RackPiece[] }> {
    return inShop(this.db, actor, 'rack.see', async (trx) => ({ pieces: (await listRack(trx)).map(toPiece) }));
  }

  /** Puts an offcut on the rack under the next code. @throws ProblemError validation_failed for a job that is not there */
  create(actor: Actor, fields: ParsedBody<typeof createRackPiece>): Promise<RackPiece> {
    return inShopOnce(this.db, actor, 'rack.edit', async (trx) => {
      if (fields.fromJobId && !(await findJob(trx, fields.fromJobId))) {
        throw new ProblemError('validation_failed', 'There is no such job in this shop.', {
          issues: [{ path: 'body.fromJobId', message: 'a job of this shop, please' }],
        });
      }
      const code = await takeRackCode(trx, actor.shopId);
      const id = await insertRackPiece(trx, actor, code, fields);
      await logAct(trx, {
        shopId: actor.shopId,
        personId: actor.personId,
        action: 'rack.added',
        data: { code },
        ...(fields.fromJobId ? { jobId: fields.fromJobId } : {}),
      });
      await announce(trx, actor.shopId, { kind: 'rack' });
      const piece = await findRackPiece(trx, id);
      if (!piece) throw new Error('the piece just put on the rack is not there');
      return toPiece(piece);
    });
  }
}

function toPiece(piece: RackRecord): RackPiece {
  return { ...piece, createdAt: piece.createdAt.toISOString() };
}
