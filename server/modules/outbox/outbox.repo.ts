import type { Insertable, Updateable } from 'kysely'
import type { Reader, Trx } from '../../db/open-database.ts'
import type { OutboxTable } from './outbox.table.ts'

export async function insertLetter(trx: Trx, row: Insertable<OutboxTable>): Promise<void> {
  await trx.insertInto('outbox').values(row).execute()
}

/** Waiting ones whose turn it is, oldest first. */
export function dueLetters(db: Reader, now: string, limit: number): Promise<OutboxTable[]> {
  return db
    .selectFrom('outbox')
    .selectAll()
    .where('status', '=', 'waiting')
    .where('nextAt', '<=', now)
    .orderBy('nextAt')
    .orderBy('createdAt')
    .limit(limit)
    .execute()
}

export async function updateLetter(trx: Trx, id: string, change: Updateable<OutboxTable>): Promise<void> {
  await trx.updateTable('outbox').set(change).where('id', '=', id).execute()
}

export function lettersAbout(db: Reader, quoteId: string): Promise<OutboxTable[]> {
  return db.selectFrom('outbox').selectAll().where('quoteId', '=', quoteId).orderBy('createdAt').execute()
}
