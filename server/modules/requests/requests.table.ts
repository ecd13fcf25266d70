import type { RequestStatus } from '../../../shared/quoting/statuses.ts'

export interface RequestsTable {
  id: string
  number: string
  companyId: string
  contactId: string
  version: number
  status: RequestStatus
  title: string
  /** JSON. */
  shipTo: string
  neededBy: string | null
  notes: string
  reason: string | null
  /** JSON: what was asked, and what was offered when it was last saved. */
  lines: string
  marks: number
  pieces: number
  indicativeTotal: number | null
  currency: string
  createdAt: string
  submittedAt: string | null
}
