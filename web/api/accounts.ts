import type { QueryInputOf } from '../../shared/contracts/operations.ts'
import { call, callFile } from './client.ts'

export const accountKeys = {
  summary: ['accounts', 'summary'] as const,
  deposits: ['accounts', 'deposits'] as const,
  ledger: (account: string) => ['accounts', 'ledger', account] as const,
}

export function readAccounts() {
  return call('readAccounts', {})
}
export function listDeposits(query: QueryInputOf<'listDeposits'>) {
  return call('listDeposits', { query })
}
export function listLedger(query: QueryInputOf<'listLedger'>) {
  return call('listLedger', { query })
}
export function readLedgerCsv() {
  return callFile('readLedgerCsv', {})
}
