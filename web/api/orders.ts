import type { QueryInputOf } from '../../shared/contracts/operations.ts'
import { call } from './client.ts'

export const orderKeys = {
  all: ['orders'] as const,
  one: (id: string) => ['orders', id] as const,
}

export function listOrders(query: QueryInputOf<'listOrders'>) {
  return call('listOrders', { query })
}
export function readOrder(id: string) {
  return call('readOrder', { params: { id } })
}
export function payDeposit(id: string, idempotencyKey: string) {
  return call('payDeposit', { params: { id }, idempotencyKey })
}
