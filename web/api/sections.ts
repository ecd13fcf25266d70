import type { QueryInputOf } from '../../shared/contracts/operations.ts'
import { call } from './client.ts'

export const sectionKeys = {
  list: (query: QueryInputOf<'listSections'>) => ['sections', query] as const,
  one: (designation: string) => ['sections', designation] as const,
  capacity: (designation: string, query: QueryInputOf<'readCapacity'>) =>
    ['sections', designation, 'capacity', query] as const,
}

export function listSections(query: QueryInputOf<'listSections'>, signal?: AbortSignal) {
  return call('listSections', { query, ...(signal ? { signal } : {}) })
}
export function readSection(designation: string, signal?: AbortSignal) {
  return call('readSection', { params: { designation }, ...(signal ? { signal } : {}) })
}
export function readCapacity(designation: string, query: QueryInputOf<'readCapacity'>, signal?: AbortSignal) {
  return call('readCapacity', { params: { designation }, query, ...(signal ? { signal } : {}) })
}
