import { nextNumber as after, type Numbered } from '../../shared/quoting/numbering.ts'
import type { Trx } from './open-database.ts'

/** The next number of a kind; given out once, in the transaction that uses it. */
export async function nextNumber(trx: Trx, kind: Numbered): Promise<string> {
  const row = await trx.selectFrom('counters').select('last').where('kind', '=', kind).executeTakeFirst()
  const next = after(kind, row?.last ?? null)
  await trx
    .insertInto('counters')
    .values({ kind, last: next })
    .onConflict((conflict) => conflict.column('kind').doUpdateSet({ last: next }))
    .execute()
  return next
}
