import { createHash } from 'node:crypto'
import type { AnswerOf, QueryOf } from '../../../shared/contracts/operations.ts'
import { pageFrom, readCursor } from '../../db/cursor.ts'
import type { Db, Reader, Trx } from '../../db/open-database.ts'
import { entriesAfter, entriesBefore, insertEntry, lastHash, type AuditRow } from './audit.repo.ts'

export interface Deed {
  at: string
  who: string
  /** Such as `quote approved`. */
  action: string
  /** Such as `Q-1001 A`. */
  record: string
  before?: unknown
  after?: unknown
}

type Sealed = Pick<AuditRow, 'at' | 'who' | 'action' | 'record' | 'before' | 'after' | 'previousHash'>

/** Each row carries the hash of the one before: a row that is changed or taken out breaks the chain. */
function sealOf({ at, who, action, record, before, after, previousHash }: Sealed): string {
  return createHash('sha256')
    .update(JSON.stringify([previousHash, at, who, action, record, before, after]))
    .digest('hex')
}

/** Writes who did what, in the transaction that did it. */
export async function recordAudit(trx: Trx, { before = null, after = null, ...deed }: Deed): Promise<void> {
  const row = {
    ...deed,
    before: JSON.stringify(before),
    after: JSON.stringify(after),
    previousHash: await lastHash(trx),
  }
  await insertEntry(trx, { ...row, hash: sealOf(row) })
}

const CHUNK = 500

/** Whether every row still follows from the one before. */
export async function auditChain(db: Reader): Promise<'whole' | 'broken'> {
  let previous = ''
  let after = 0
  for (;;) {
    const rows = await entriesAfter(db, after, CHUNK)
    for (const row of rows) {
      if (row.previousHash !== previous || row.hash !== sealOf(row)) return 'broken'
      previous = row.hash
      after = row.id
    }
    if (rows.length < CHUNK) return 'whole'
  }
}

export async function listAudit(
  db: Db,
  { limit, cursor }: QueryOf<'listAudit'>,
): Promise<AnswerOf<'listAudit'>> {
  const at = readCursor(cursor)
  const rows = await entriesBefore(db, at && Number(at.id), limit + 1)
  const page = pageFrom(
    rows,
    limit,
    (row) => ({ at: row.at, id: String(row.id) }),
    ({ id, at: when, who, action, record, before, after }) => ({
      id,
      at: when,
      who,
      action,
      record,
      before: JSON.parse(before) as unknown,
      after: JSON.parse(after) as unknown,
    }),
  )
  return { ...page, chain: await auditChain(db) }
}
