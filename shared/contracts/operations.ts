import { z } from 'zod'
import { accountsSummary, depositRow, ledgerEntry, ledgerQuery } from './accounts.ts'
import { auditAnswer, auditQuery, priceBookAnswer } from './admin.ts'
import { basePlateAnswer, basePlateBody, checkBody, columnCheck } from './checks.ts'
import { byId, nothing, pageOf, pageQuery } from './common.ts'
import { checkoutAnswer, orderDto, ordersQuery, orderSummary } from './orders.ts'
import { proposalAnswer, proposalBody, scheduleBody } from './proposals.ts'
import {
  acceptAnswer,
  acceptBody,
  declineBody,
  quoteAt,
  quoteDto,
  quotesQuery,
  quoteSummary,
  revisionBody,
} from './quotes.ts'
import { reasonBody, requestBody, requestDto, requestsQuery, requestSummary } from './requests.ts'
import {
  bySection,
  capacityAnswer,
  capacityQuery,
  sectionDetail,
  sectionsQuery,
  sectionSummary,
} from './sections.ts'
import { personRow, sessionAnswer, signInBody } from './session.ts'

/** One operation of the API: the same schemas validate on the server, parse in the client and make the OpenAPI page. */
export interface Operation {
  method: 'get' | 'post' | 'put' | 'patch' | 'delete'
  /** Express form: `/api/requests/:id`. */
  path: string
  summary: string
  params?: z.ZodType
  query?: z.ZodType
  body?: z.ZodType
  /** JSON answer; `file` for anything else. */
  answer: z.ZodType | 'file'
  status?: 200 | 201 | 204
  /** A write that names the version it read. */
  ifMatch?: true
  /** Takes an Idempotency-Key. */
  idempotent?: true
}

function define<const T extends Record<string, Operation>>(operations: T): T {
  return operations
}

export const operations = define({
  signIn: {
    method: 'post',
    path: '/api/session',
    summary: 'Sign in',
    body: signInBody,
    answer: sessionAnswer,
    status: 201,
  },
  readSession: { method: 'get', path: '/api/session', summary: 'Who is signed in', answer: sessionAnswer },
  signOut: { method: 'delete', path: '/api/session', summary: 'Sign out', answer: nothing, status: 204 },

  checkColumn: {
    method: 'post',
    path: '/api/checks',
    summary: 'Does this section carry this?',
    body: checkBody,
    answer: columnCheck,
  },
  designBasePlate: {
    method: 'post',
    path: '/api/base-plates',
    summary: 'Check or find a base plate',
    body: basePlateBody,
    answer: basePlateAnswer,
  },
  propose: {
    method: 'post',
    path: '/api/proposals',
    summary: 'Propose a shape and its price; for a list of lines, a stream of one JSON object a line',
    body: z.union([scheduleBody, proposalBody]),
    answer: proposalAnswer,
  },
  listSections: {
    method: 'get',
    path: '/api/sections',
    summary: 'The catalogue',
    query: sectionsQuery,
    answer: z.object({ items: z.array(sectionSummary) }),
  },
  readSection: {
    method: 'get',
    path: '/api/sections/:designation',
    summary: 'One shape',
    params: bySection,
    answer: sectionDetail,
  },
  readCapacity: {
    method: 'get',
    path: '/api/sections/:designation/capacity',
    summary: 'Available strength against length',
    params: bySection,
    query: capacityQuery,
    answer: capacityAnswer,
  },

  listRequests: {
    method: 'get',
    path: '/api/requests',
    summary: 'Requests',
    query: requestsQuery,
    answer: pageOf(requestSummary),
  },
  createRequest: {
    method: 'post',
    path: '/api/requests',
    summary: 'Save a new request as a draft',
    body: requestBody,
    answer: requestDto,
    status: 201,
    idempotent: true,
  },
  readRequest: {
    method: 'get',
    path: '/api/requests/:id',
    summary: 'One request',
    params: byId,
    answer: requestDto,
  },
  editRequest: {
    method: 'put',
    path: '/api/requests/:id',
    summary: 'Change a draft',
    params: byId,
    body: requestBody,
    answer: requestDto,
    ifMatch: true,
  },
  submitRequest: {
    method: 'post',
    path: '/api/requests/:id/submit',
    summary: 'Ask for a firm quote',
    params: byId,
    answer: requestDto,
    ifMatch: true,
  },
  withdrawRequest: {
    method: 'post',
    path: '/api/requests/:id/withdraw',
    summary: 'Take a request back',
    params: byId,
    answer: requestDto,
  },
  declineRequest: {
    method: 'post',
    path: '/api/requests/:id/decline',
    summary: 'The shop will not quote it',
    params: byId,
    body: reasonBody,
    answer: requestDto,
  },
  openQuote: {
    method: 'post',
    path: '/api/requests/:id/quote',
    summary: 'Take into review: quote with revision A',
    params: byId,
    answer: quoteDto,
    status: 201,
    idempotent: true,
  },

  listQuotes: {
    method: 'get',
    path: '/api/quotes',
    summary: 'Quotes',
    query: quotesQuery,
    answer: pageOf(quoteSummary),
  },
  readQuote: {
    method: 'get',
    path: '/api/quotes/:id',
    summary: 'One quote with its latest revision',
    params: byId,
    answer: quoteDto,
  },
  tryRevision: {
    method: 'post',
    path: '/api/quotes/:id/revisions/:letter/try',
    summary: 'Check and price an edit without keeping it',
    params: quoteAt,
    body: revisionBody,
    answer: quoteDto,
  },
  editRevision: {
    method: 'put',
    path: '/api/quotes/:id/revisions/:letter',
    summary: 'Keep an edit of a draft revision',
    params: quoteAt,
    body: revisionBody,
    answer: quoteDto,
    ifMatch: true,
  },
  approveRevision: {
    method: 'post',
    path: '/api/quotes/:id/revisions/:letter/approve',
    summary: 'Approve',
    params: quoteAt,
    answer: quoteDto,
    ifMatch: true,
  },
  sendRevision: {
    method: 'post',
    path: '/api/quotes/:id/revisions/:letter/send',
    summary: 'Send by e-mail; unchangeable from here',
    params: quoteAt,
    answer: quoteDto,
    ifMatch: true,
    idempotent: true,
  },
  withdrawRevision: {
    method: 'post',
    path: '/api/quotes/:id/revisions/:letter/withdraw',
    summary: 'Take a revision back',
    params: quoteAt,
    answer: quoteDto,
  },
  reviseQuote: {
    method: 'post',
    path: '/api/quotes/:id/revisions',
    summary: 'Next revision, as a copy',
    params: byId,
    answer: quoteDto,
    status: 201,
    idempotent: true,
  },
  readQuoteDocument: {
    method: 'get',
    path: '/api/quotes/:id/revisions/:letter/document.pdf',
    summary: 'The quote as PDF',
    params: quoteAt,
    answer: 'file',
  },
  acceptRevision: {
    method: 'post',
    path: '/api/quotes/:id/revisions/:letter/accept',
    summary: 'Accept under own name',
    params: quoteAt,
    body: acceptBody,
    answer: acceptAnswer,
    status: 201,
    idempotent: true,
  },
  declineRevision: {
    method: 'post',
    path: '/api/quotes/:id/revisions/:letter/decline',
    summary: 'Decline with a reason',
    params: quoteAt,
    body: declineBody,
    answer: quoteDto,
  },
  readLinkedQuote: {
    method: 'get',
    path: '/api/quote-link',
    summary: 'The quote that a private link opens',
    answer: quoteDto,
  },

  listOrders: {
    method: 'get',
    path: '/api/orders',
    summary: 'Orders',
    query: ordersQuery,
    answer: pageOf(orderSummary),
  },
  readOrder: { method: 'get', path: '/api/orders/:id', summary: 'One order', params: byId, answer: orderDto },
  payDeposit: {
    method: 'post',
    path: '/api/orders/:id/deposit',
    summary: 'Start paying the deposit by card',
    params: byId,
    answer: checkoutAnswer,
    status: 201,
    idempotent: true,
  },
  receiveStripeEvent: {
    method: 'post',
    path: '/api/stripe/events',
    summary: 'Signed events of the card processor',
    answer: nothing,
  },

  readAccounts: {
    method: 'get',
    path: '/api/accounts/summary',
    summary: 'Deposits and balances',
    answer: accountsSummary,
  },
  listDeposits: {
    method: 'get',
    path: '/api/accounts/deposits',
    summary: 'Deposits by order',
    query: pageQuery,
    answer: pageOf(depositRow),
  },
  listLedger: {
    method: 'get',
    path: '/api/ledger',
    summary: 'Ledger entries',
    query: ledgerQuery,
    answer: pageOf(ledgerEntry),
  },
  readLedgerCsv: {
    method: 'get',
    path: '/api/ledger.csv',
    summary: 'The whole ledger as CSV',
    answer: 'file',
  },

  listPeople: {
    method: 'get',
    path: '/api/people',
    summary: 'People',
    query: pageQuery,
    answer: pageOf(personRow),
  },
  readPriceBook: {
    method: 'get',
    path: '/api/price-books/current',
    summary: 'The price book in force',
    answer: priceBookAnswer,
  },
  listAudit: {
    method: 'get',
    path: '/api/audit',
    summary: 'Audit trail, newest first',
    query: auditQuery,
    answer: auditAnswer,
  },

  readOpenApi: { method: 'get', path: '/api/openapi.json', summary: 'This description', answer: 'file' },
  health: {
    method: 'get',
    path: '/healthz',
    summary: 'Alive',
    answer: z.object({ status: z.literal('ok') }),
  },
  ready: {
    method: 'get',
    path: '/readyz',
    summary: 'Store, mail and payments reachable',
    answer: z.object({ store: z.boolean(), mail: z.boolean(), payments: z.boolean() }),
  },
})

export type Operations = typeof operations
export type OperationId = keyof Operations
type Of<Id extends OperationId, Key extends string> =
  Operations[Id] extends Record<Key, infer S> ? S : undefined
export type ParamsOf<Id extends OperationId> = Of<Id, 'params'> extends z.ZodType<infer T> ? T : undefined
export type QueryOf<Id extends OperationId> = Of<Id, 'query'> extends z.ZodType<infer T> ? T : undefined
export type BodyOf<Id extends OperationId> = Of<Id, 'body'> extends z.ZodType<infer T> ? T : undefined
/** What a client may send, before defaults are filled in. */
export type BodyInputOf<Id extends OperationId> =
  Of<Id, 'body'> extends z.ZodType ? z.input<Of<Id, 'body'>> : undefined
export type QueryInputOf<Id extends OperationId> =
  Of<Id, 'query'> extends z.ZodType ? z.input<Of<Id, 'query'>> : undefined
export type AnswerOf<Id extends OperationId> = Of<Id, 'answer'> extends z.ZodType<infer T> ? T : never
