/** Never changed: a trigger refuses it. */
export interface PriceBooksTable {
  version: number
  firstDay: string
  /** JSON of a price book. */
  book: string
  createdAt: string
}
