/** Never changed: a trigger refuses it. */
export interface PriceBooksTable {
  version: number
  firstDay: string
  /** JSON of a price book. */
  book: string
  createdAt: string
}

export interface TaxRegionsTable {
  region: string
  /** Fraction as exact decimal. */
  rate: string
}
