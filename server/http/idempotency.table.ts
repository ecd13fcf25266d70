/** What was answered to a key: the same key and body gives the same answer. */
export interface IdempotencyTable {
  owner: string
  key: string
  fingerprint: string
  answer: string
  createdAt: string
}
