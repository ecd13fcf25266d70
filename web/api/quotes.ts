import type { BodyInputOf, ParamsOf, QueryInputOf } from '../../shared/contracts/operations.ts'
import { call, callFile } from './client.ts'

export type QuoteAt = ParamsOf<'acceptRevision'>

export type RevisionInput = BodyInputOf<'editRevision'>

export const quoteKeys = {
  all: ['quotes'] as const,
  one: (id: string) => ['quotes', id] as const,
  linked: ['linked-quote'] as const,
}

export function listQuotes(query: QueryInputOf<'listQuotes'>, signal?: AbortSignal) {
  return call('listQuotes', { query, ...(signal ? { signal } : {}) })
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

export function tryRevision(params: QuoteAt, body: RevisionInput, signal: AbortSignal) {
  return call('tryRevision', { params, body, signal })
}
export function editRevision(params: QuoteAt, body: RevisionInput, version: number) {
  return call('editRevision', { params, body, ifMatch: version })
}
export function approveRevision(params: QuoteAt, version: number) {
  return call('approveRevision', { params, ifMatch: version })
}
export function sendRevision(params: QuoteAt, version: number, idempotencyKey: string) {
  return call('sendRevision', { params, ifMatch: version, idempotencyKey })
}
export function withdrawRevision(params: QuoteAt) {
  return call('withdrawRevision', { params })
}
export function reviseQuote(id: string, idempotencyKey: string) {
  return call('reviseQuote', { params: { id }, idempotencyKey })
}
