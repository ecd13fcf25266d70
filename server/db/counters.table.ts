/** The last number given out of each kind. */
export interface CountersTable {
  kind: string
  last: string
}
