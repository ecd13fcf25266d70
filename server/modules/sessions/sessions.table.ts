export interface SessionsTable {
  /** SHA-256 of the token: what is stolen from here opens nothing. */
  tokenHash: string
  personId: string
  createdAt: string
  seenAt: string
}

/** Failures of late, by account, address, and both. */
export interface SignInAttemptsTable {
  key: string
  failures: number
  lastAt: string
}
