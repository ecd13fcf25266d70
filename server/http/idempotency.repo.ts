import type { Reader, Trx } from '../db/open-database.ts'
import type { IdempotencyTable } from './idempotency.table.ts'

export function findAnswer(db: Reader, owner: string, key: string): Promise<IdempotencyTable | undefined> {
  return db
    .selectFrom('idempotency')
    .selectAll()
    .where('owner', '=', owner)
    .where('key', '=', key)
    .executeTakeFirst()
}

export async function keepAnswer(trx: Trx, row: IdempotencyTable): Promise<void> {
  await trx.insertInto('idempotency').values(row).execute()
}

export async function forgetAnswersBefore(trx: Trx, instant: string): Promise<void> {
  await trx.deleteFrom('idempotency').where('createdAt', '<', instant).execute()
}
