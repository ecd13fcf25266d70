import type { RevisionStatus } from '../../../shared/quoting/statuses.ts'

export interface QuotesTable {
  id: string
  number: string
  requestId: string
  companyId: string
  createdAt: string
}

/** Once sent, only its answer may be written: a trigger refuses the rest. */
export interface RevisionsTable {
  id: string
  quoteId: string
  position: number
  letter: string
  status: RevisionStatus
  version: number
  /** JSON: lines as worked out, and their price. */
  lines: string
  price: string
  discount: string
  note: string
  /** JSON: why it cannot be approved. */
  blockers: string
  total: number
  currency: string
  priceBookVersion: number
  preparedBy: string
  approvedBy: string | null
  approvedAt: string | null
  sentAt: string | null
  validUntil: string | null
  documentKey: string | null
  documentSha256: string | null
  answeredBy: string | null
  answeredAt: string | null
  answerReason: string | null
}
