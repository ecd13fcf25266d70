import { randomUUID } from 'node:crypto'
import type { Trx } from '../../db/open-database.ts'
import { insertEntries } from './accounts.repo.ts'
import type { Account } from './accounts.table.ts'

export interface Booking {
  at: string
  memo: string
  currency: string
  orderId: string | null
  paymentId: string | null
  /** Debit positive, credit negative, minor units. */
  entries: { account: Account; amount: number }[]
}

/** Books a transaction. Its debits equal its credits, or nothing is booked. */
export async function postToLedger(trx: Trx, { entries, ...common }: Booking): Promise<void> {
  const sum = entries.reduce((total, { amount }) => total + amount, 0)
  const whole = entries.every(({ amount }) => Number.isSafeInteger(amount) && amount !== 0)
  if (sum !== 0 || !whole || entries.length < 2) {
    throw new Error(`a booking that does not balance: ${JSON.stringify(entries)}`)
  }
  const transactionId = randomUUID()
  await insertEntries(
    trx,
    entries.map((entry) => ({ id: randomUUID(), transactionId, ...common, ...entry })),
  )
}
