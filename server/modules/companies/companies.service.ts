import type { Reader, Trx } from '../../db/open-database.ts'
import { notFound } from '../../errors.ts'
import { findCompany, insertCompany, type CompanyRow } from './companies.repo.ts'

export async function companyOf(db: Reader, id: string): Promise<CompanyRow> {
  return (await findCompany(db, id)) ?? notFound('company')
}

export function addCompany(trx: Trx, row: CompanyRow): Promise<void> {
  return insertCompany(trx, row)
}
