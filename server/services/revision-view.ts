import type { RevisionSummary } from '@/shared/contracts/revisions';
import type { RevisionRecord } from '../repositories/revision-repository';

/** @param seq - edits in the layout now */
export function toSummary(row: RevisionRecord, seq: number): RevisionSummary {
  const { signedOffAt, signedOffBy, sentBackAt, sentBackBy } = row;
  return {
    id: row.id,
    number: row.number,
    layoutSeq: row.layoutSeq,
    engine: row.engine,
    sha256: row.sha256.toString('hex'),
    note: row.note,
    createdAt: row.createdAt.toISOString(),
    createdBy: row.createdBy,
    signedOff: signedOffAt && signedOffBy ? { at: signedOffAt.toISOString(), by: signedOffBy } : null,
    sentBack:
      sentBackAt && sentBackBy ? { at: sentBackAt.toISOString(), by: sentBackBy, note: row.sentBackNote } : null,
    changedSince: seq > row.layoutSeq,
  };
}
