import type { IdempotencyTable } from '../http/idempotency.table.ts'
import type { AuditTable } from '../modules/audit/audit.table.ts'
import type { CompaniesTable } from '../modules/companies/companies.table.ts'
import type { OrderProgressTable, OrdersTable } from '../modules/orders/orders.table.ts'
import type { LedgerTable } from '../modules/accounts/accounts.table.ts'
import type { OutboxTable } from '../modules/outbox/outbox.table.ts'
import type { PaymentsTable, StripeEventsTable } from '../modules/payments/payments.table.ts'
import type { PeopleTable } from '../modules/people/people.table.ts'
import type { PriceBooksTable } from '../modules/price-books/price-books.table.ts'
import type { QuotesTable, RevisionsTable } from '../modules/quotes/quotes.table.ts'
import type { RequestsTable } from '../modules/requests/requests.table.ts'
import type { SessionsTable, SignInAttemptsTable } from '../modules/sessions/sessions.table.ts'
import type { CountersTable } from './counters.table.ts'

/** Every table, under its name. */
export interface Database {
  counters: CountersTable
  idempotency: IdempotencyTable
  audit: AuditTable
  companies: CompaniesTable
  people: PeopleTable
  sessions: SessionsTable
  signInAttempts: SignInAttemptsTable
  priceBooks: PriceBooksTable
  requests: RequestsTable
  quotes: QuotesTable
  revisions: RevisionsTable
  orders: OrdersTable
  orderProgress: OrderProgressTable
  outbox: OutboxTable
  payments: PaymentsTable
  stripeEvents: StripeEventsTable
  ledger: LedgerTable
}
