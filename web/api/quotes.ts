import type { BodyInputOf, ParamsOf } from '../../shared/contracts/operations.ts'
import { call, callFile } from './client.ts'

export type QuoteAt = ParamsOf<'acceptRevision'>

export const quoteKeys = {
  all: ['quotes'] as const,
  one: (id: string) => ['quotes', id] as const,
  linked: ['linked-quote'] as const,
}

export function readQuote(id: string) {
  return call('readQuote', { params: { id } })
}
export function readLinkedQuote() {
  return call('readLinkedQuote', {})
}
export function acceptRevision(params: QuoteAt, body: BodyInputOf<'acceptRevision'>, idempotencyKey: string) {
  return call('acceptRevision', { params, body, idempotencyKey })
}
export function declineRevision(params: QuoteAt, body: BodyInputOf<'declineRevision'>) {
  return call('declineRevision', { params, body })
}
export function readQuoteDocument(params: QuoteAt) {
  return callFile('readQuoteDocument', { params })
}
