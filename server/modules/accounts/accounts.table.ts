import type { LEDGER_ACCOUNTS } from '../../../shared/contracts/accounts.ts'

export type Account = (typeof LEDGER_ACCOUNTS)[number]

/** One side of a booking. Append only: triggers refuse to change or delete a row. */
export interface LedgerTable {
  id: string
  transactionId: string
  at: string
  account: Account
  /** Debit positive, credit negative; minor units. */
  amount: number
  currency: string
  memo: string
  orderId: string | null
  paymentId: string | null
}
