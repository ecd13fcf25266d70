import type { BodyInputOf, QueryInputOf } from '../../shared/contracts/operations.ts'
import { call } from './client.ts'

export type RequestInput = BodyInputOf<'createRequest'>

export const requestKeys = {
  all: ['requests'] as const,
  one: (id: string) => ['requests', id] as const,
}

export function listRequests(query: QueryInputOf<'listRequests'>, signal?: AbortSignal) {
  return call('listRequests', { query, ...(signal ? { signal } : {}) })
}
export function readRequest(id: string) {
  return call('readRequest', { params: { id } })
}
export function createRequest(body: RequestInput, idempotencyKey: string) {
  return call('createRequest', { body, idempotencyKey })
}
export function editRequest(id: string, version: number, body: RequestInput) {
  return call('editRequest', { params: { id }, body, ifMatch: version })
}
export function submitRequest(id: string, version: number) {
  return call('submitRequest', { params: { id }, ifMatch: version })
}
export function withdrawRequest(id: string) {
  return call('withdrawRequest', { params: { id } })
}
export function declineRequest(id: string, reason: string) {
  return call('declineRequest', { params: { id }, body: { reason } })
}
/** Takes a request into review; the same key for the same request, however often it is pressed. */
export function openQuote(id: string, idempotencyKey: string) {
  return call('openQuote', { params: { id }, idempotencyKey })
}
