import type { Insertable, Selectable } from 'kysely'
import type { Reader, Trx } from '../../db/open-database.ts'
import type { CompaniesTable } from './companies.table.ts'

export type CompanyRow = Selectable<CompaniesTable>

export function findCompany(db: Reader, id: string): Promise<CompanyRow | undefined> {
  return db.selectFrom('companies').selectAll().where('id', '=', id).executeTakeFirst()
}

export async function insertCompany(trx: Trx, row: Insertable<CompaniesTable>): Promise<void> {
  await trx.insertInto('companies').values(row).execute()
}
