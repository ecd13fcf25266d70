import { z } from 'zod'
import { id, instant, money, pageQuery } from './common.ts'

/** Accounts of the ledger. Balances are derived, never stored. */
export const LEDGER_ACCOUNTS = [
  'card clearing',
  'customer deposits',
  'receivable',
  'revenue',
  'tax payable',
  'processor fees',
  'bank',
] as const

export const accountsSummary = z.object({
  depositsDue: money,
  depositsPaid: money,
  depositsHeld: money,
  balances: z.array(
    z.object({ account: z.enum(LEDGER_ACCOUNTS), debit: money, credit: money, balance: money }),
  ),
  /** Sum of all entries: zero, or the books are broken. */
  sum: money,
})
export const depositRow = z.object({
  order: z.object({ id, number: z.string() }),
  company: z.object({ id, name: z.string() }),
  due: money,
  paid: money,
  status: z.string(),
  since: instant,
})
export const ledgerEntry = z.object({
  id,
  transactionId: id,
  at: instant,
  account: z.enum(LEDGER_ACCOUNTS),
  /** Debit positive, credit negative. */
  amount: money,
  memo: z.string(),
  order: z.object({ id, number: z.string() }).nullable(),
})
export const ledgerQuery = pageQuery.extend({ account: z.enum(LEDGER_ACCOUNTS).optional() })
