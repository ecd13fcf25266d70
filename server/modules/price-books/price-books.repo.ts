import type { Insertable } from 'kysely'
import type { Reader, Trx } from '../../db/open-database.ts'
import type { PriceBooksTable } from './price-books.table.ts'

export function bookInForce(db: Reader, day: string): Promise<PriceBooksTable | undefined> {
  return db
    .selectFrom('priceBooks')
    .selectAll()
    .where('firstDay', '<=', day)
    .orderBy('firstDay', 'desc')
    .orderBy('version', 'desc')
    .limit(1)
    .executeTakeFirst()
}

export function bookOfVersion(db: Reader, version: number): Promise<PriceBooksTable | undefined> {
  return db.selectFrom('priceBooks').selectAll().where('version', '=', version).executeTakeFirst()
}

export async function insertBook(trx: Trx, row: Insertable<PriceBooksTable>): Promise<void> {
  await trx.insertInto('priceBooks').values(row).execute()
}
