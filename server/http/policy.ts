import type { RoleName } from '../../shared/contracts/common.ts'
import type { OperationId } from '../../shared/contracts/operations.ts'

/** `anyone` needs no session; `link` holds the private link of a quote. */
export type Caller = RoleName | 'link' | 'anyone'

const SIGNED_IN = ['contractor', 'estimator', 'accounts', 'admin'] as const
const ESTIMATING = ['estimator', 'admin'] as const
const MONEY = ['accounts', 'admin'] as const

/**
 * Who may call what: one row an operation, and the types insist on every row. Rights on a record (own company, own
 * quote) are the service's.
 */
export const policy = {
  signIn: ['anyone'],
  readSession: ['anyone'],
  signOut: ['anyone'],

  checkColumn: SIGNED_IN,
  designBasePlate: SIGNED_IN,
  propose: SIGNED_IN,
  listSections: SIGNED_IN,
  readSection: SIGNED_IN,
  readCapacity: SIGNED_IN,

  listRequests: ['contractor', ...ESTIMATING],
  createRequest: ['contractor'],
  readRequest: ['contractor', ...ESTIMATING],
  editRequest: ['contractor'],
  submitRequest: ['contractor'],
  withdrawRequest: ['contractor'],
  declineRequest: ESTIMATING,
  openQuote: ESTIMATING,

  listQuotes: SIGNED_IN,
  readQuote: SIGNED_IN,
  tryRevision: ESTIMATING,
  editRevision: ESTIMATING,
  approveRevision: ESTIMATING,
  sendRevision: ESTIMATING,
  withdrawRevision: ESTIMATING,
  reviseQuote: ESTIMATING,
  readQuoteDocument: [...SIGNED_IN, 'link'],
  acceptRevision: ['contractor', 'link'],
  declineRevision: ['contractor', 'link'],
  readLinkedQuote: ['link'],

  listOrders: SIGNED_IN,
  readOrder: [...SIGNED_IN, 'link'],
  payDeposit: ['contractor', 'link'],
  receiveStripeEvent: ['anyone'],

  readAccounts: MONEY,
  listDeposits: MONEY,
  listLedger: MONEY,
  readLedgerCsv: MONEY,

  listPeople: ['admin'],
  readPriceBook: ESTIMATING,
  listAudit: ['admin'],

  readOpenApi: ['anyone'],
  health: ['anyone'],
  ready: ['anyone'],
} as const satisfies Record<OperationId, readonly Caller[]>

export function allows(id: OperationId, caller: Caller): boolean {
  const callers: readonly Caller[] = policy[id]
  return callers.includes('anyone') || callers.includes(caller)
}
