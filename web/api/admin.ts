import type { QueryInputOf } from '../../shared/contracts/operations.ts'
import { call } from './client.ts'

export const adminKeys = {
  people: (q: string) => ['people', q] as const,
  priceBook: ['price-book'] as const,
  audit: ['audit'] as const,
}

export function listPeople(query: QueryInputOf<'listPeople'>) {
  return call('listPeople', { query })
}
export function readPriceBook() {
  return call('readPriceBook', {})
}
export function listAudit(query: QueryInputOf<'listAudit'>) {
  return call('listAudit', { query })
}
