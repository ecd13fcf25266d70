import type { Insertable, Updateable } from 'kysely'
import type { Reader, Trx } from '../../db/open-database.ts'
import type { OutboxTable } from './outbox.table.ts'

export async function insertLetter(trx: Trx, row: Insertable<OutboxTable>): Promise<void> {
  await trx.insertInto('outbox').values(row).execute()
}

/** The waiting one whose turn has come longest ago. */
export function dueLetter(db: Reader, now: string): Promise<OutboxTable | undefined> {
  return db
    .selectFrom('outbox')
    .selectAll()
    .where('status', '=', 'waiting')
    .where('nextAt', '<=', now)
    .orderBy('nextAt')
    .orderBy('createdAt')
    .limit(1)
    .executeTakeFirst()
}

export async function updateLetter(trx: Trx, id: string, change: Updateable<OutboxTable>): Promise<void> {
  await trx.updateTable('outbox').set(change).where('id', '=', id).execute()
}

/** Only while it is still that try's: whoever took it over meanwhile, or sent it, knows better. */
export async function updateFailedTry(
  trx: Trx,
  { id, attempts }: Pick<OutboxTable, 'id' | 'attempts'>,
  change: Updateable<OutboxTable>,
): Promise<void> {
  await trx
    .updateTable('outbox')
    .set(change)
    .where('id', '=', id)
    .where('status', '=', 'waiting')
    .where('attempts', '=', attempts)
    .execute()
}

export function lettersAbout(db: Reader, quoteId: string): Promise<OutboxTable[]> {
  return db.selectFrom('outbox').selectAll().where('quoteId', '=', quoteId).orderBy('createdAt').execute()
}
