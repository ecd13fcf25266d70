import type { RoleName } from '../../shared/contracts/common.ts'

export interface Place {
  path: string
  name: string
}

const REQUESTS = { path: '/requests', name: 'Requests' }
const ORDERS = { path: '/orders', name: 'Orders' }
const DESK = { path: '/desk', name: 'Desk' }
const SECTIONS = { path: '/sections', name: 'Sections' }
const PRICE_BOOK = { path: '/price-book', name: 'Price book' }
const ACCOUNTS = { path: '/accounts', name: 'Accounts' }
const LEDGER = { path: '/ledger', name: 'Ledger' }
const PEOPLE = { path: '/people', name: 'People' }
const AUDIT = { path: '/audit', name: 'Audit' }

/** The three or four places of each role, and those that it needs more seldom. */
export const PLACES: Record<RoleName, { bar: Place[]; more: Place[] }> = {
  contractor: { bar: [REQUESTS, ORDERS], more: [] },
  estimator: { bar: [DESK, ORDERS, SECTIONS], more: [PRICE_BOOK] },
  accounts: { bar: [ACCOUNTS, LEDGER, ORDERS], more: [] },
  admin: { bar: [DESK, ORDERS, PRICE_BOOK, PEOPLE], more: [ACCOUNTS, LEDGER, SECTIONS, AUDIT] },
}

/** Where a role begins its day. */
export function homeOf(role: RoleName | null): string {
  return role ? (PLACES[role].bar[0]?.path ?? '/') : '/'
}
