import type { Generated } from 'kysely'

/** Append only: triggers refuse to change or delete a row. */
export interface AuditTable {
  id: Generated<number>
  at: string
  who: string
  action: string
  record: string
  /** JSON. */
  before: string
  after: string
  previousHash: string
  hash: string
}
