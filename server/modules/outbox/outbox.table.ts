/** A letter, written whole when what caused it was written; sent after. */
export interface OutboxTable {
  id: string
  kind: string
  toAddress: string
  subject: string
  html: string
  text: string
  /** JSON: key, file name and type of what goes with it. */
  attachment: string | null
  quoteId: string | null
  orderId: string | null
  status: 'waiting' | 'sent' | 'parked'
  attempts: number
  /** When it is tried next; while somebody is at it, when it would be free again. */
  nextAt: string
  lastError: string | null
  createdAt: string
  sentAt: string | null
}
