import { LEDGER_ACCOUNTS } from '../../../shared/contracts/accounts.ts'
import type { AnswerOf, QueryOf } from '../../../shared/contracts/operations.ts'
import { money, moneyToDecimal } from '../../../shared/pricing/money.ts'
import { pageFrom, readCursor } from '../../db/cursor.ts'
import type { Db } from '../../db/open-database.ts'
import type { Deps } from '../../deps.ts'
import type { FileAnswer } from '../../http/file-answer.ts'
import { currentBook } from '../price-books/price-books.service.ts'
import { allEntries, balances, deposits, depositSums, entriesBefore } from './accounts.repo.ts'
import { toCsv } from './csv.ts'

/** Deposits and the balance of every account, derived from the entries. */
export async function readAccounts({ db, clock }: Deps): Promise<AnswerOf<'readAccounts'>> {
  const { currency } = await currentBook(db, clock())
  const cash = (amount: number) => money(amount, currency)
  const rows = await balances(db, currency)
  const { due, paid } = await depositSums(db, currency)
  const shown = LEDGER_ACCOUNTS.map((account) => {
    const { debit = 0, credit = 0 } = rows.find((row) => row.account === account) ?? {}
    return { account, debit, credit: -credit, balance: debit + credit }
  })
  const held = -(shown.find(({ account }) => account === 'customer deposits')?.balance ?? 0)
  return {
    depositsDue: cash(due),
    depositsPaid: cash(paid),
    depositsHeld: cash(held),
    balances: shown.map(({ account, debit, credit, balance }) => ({
      account,
      debit: cash(debit),
      credit: cash(credit),
      balance: cash(balance),
    })),
    sum: cash(shown.reduce((total, { balance }) => total + balance, 0)),
  }
}

export async function listDeposits(
  db: Db,
  { limit, cursor, q }: QueryOf<'listDeposits'>,
): Promise<AnswerOf<'listDeposits'>> {
  const rows = await deposits(db, readCursor(cursor), q, limit + 1)
  return pageFrom(
    rows,
    limit,
    (row) => ({ at: row.acceptedAt, id: row.id }),
    ({ id, number, status, depositDue, currency, acceptedAt, companyId, companyName, paid }) => ({
      order: { id, number },
      company: { id: companyId, name: companyName },
      due: money(depositDue, currency),
      paid: money(paid ?? 0, currency),
      status,
      since: acceptedAt,
    }),
  )
}

export async function listLedger(
  db: Db,
  { limit, cursor, q, account }: QueryOf<'listLedger'>,
): Promise<AnswerOf<'listLedger'>> {
  const rows = await entriesBefore(db, { account, text: q, cursor: readCursor(cursor), limit: limit + 1 })
  return pageFrom(
    rows,
    limit,
    (row) => ({ at: row.at, id: row.id }),
    ({ id, transactionId, at, account: name, amount, currency, memo, orderId, orderNumber }) => ({
      ...{ id, transactionId, at, memo },
      account: name,
      amount: money(amount, currency),
      order: orderId && orderNumber ? { id: orderId, number: orderNumber } : null,
    }),
  )
}

/** The whole ledger for the bookkeeper: one line an entry, amounts as decimals. */
export async function ledgerCsv({ db, clock }: Deps): Promise<FileAnswer> {
  const rows = await allEntries(db)
  const header = ['date', 'transaction', 'account', 'debit', 'credit', 'currency', 'memo', 'order']
  const lines = rows.map(({ at, transactionId, account, amount, currency, memo, orderNumber }) => {
    const text = moneyToDecimal(money(Math.abs(amount), currency))
    return [
      at,
      transactionId,
      account,
      amount > 0 ? text : '',
      amount < 0 ? text : '',
      currency,
      memo,
      orderNumber ?? '',
    ]
  })
  return {
    contentType: 'text/csv; charset=utf-8',
    fileName: `ledger-${clock().toISOString().slice(0, 10)}.csv`,
    body: toCsv([header, ...lines]),
  }
}
