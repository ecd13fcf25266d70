import type { IdempotencyTable } from '../http/idempotency.table.ts'
import type { AuditTable } from '../modules/audit/audit.table.ts'
import type { CompaniesTable } from '../modules/companies/companies.table.ts'
import type { PeopleTable } from '../modules/people/people.table.ts'
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
}
