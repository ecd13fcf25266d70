import type { PriceBook } from '../pricing/price-book.ts'

/** What a price rests on beside the line itself; null delivery: collected. */
export interface PriceTerms {
  book: PriceBook
  delivery: { km: number } | null
}
