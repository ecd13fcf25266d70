import type { Insertable, Selectable } from 'kysely'
import type { Reader, Trx } from '../../db/open-database.ts'
import type { AuditTable } from './audit.table.ts'

export type AuditRow = Selectable<AuditTable>

export async function lastHash(trx: Trx): Promise<string> {
  const row = await trx.selectFrom('audit').select('hash').orderBy('id', 'desc').limit(1).executeTakeFirst()
  return row?.hash ?? ''
}

export async function insertEntry(trx: Trx, row: Insertable<AuditTable>): Promise<void> {
  await trx.insertInto('audit').values(row).execute()
}

export function entriesBefore(db: Reader, id: number | undefined, limit: number): Promise<AuditRow[]> {
  return db
    .selectFrom('audit')
    .selectAll()
    .$if(id !== undefined, (query) => query.where('id', '<', id ?? 0))
    .orderBy('id', 'desc')
    .limit(limit)
    .execute()
}

export function entriesAfter(db: Reader, id: number, limit: number): Promise<AuditRow[]> {
  return db.selectFrom('audit').selectAll().where('id', '>', id).orderBy('id').limit(limit).execute()
}
