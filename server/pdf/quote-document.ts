import type { QuoteDto } from '../../shared/contracts/quotes.ts'
import type { UnitSystem } from '../../shared/units/step.ts'

/** What a document says about the shop. */
export interface ShopDetails {
  name: string
  /** Lines of the postal address. */
  address: string[]
  phone: string
  email: string
  paper: 'A4' | 'Letter'
  /** Units in which the shop's customers read. */
  system: UnitSystem
}

export interface QuoteDocument {
  /** The quote as its contractor may see it. */
  quote: QuoteDto
  shop: ShopDetails
  /** Instant at which the document is made, ISO 8601. */
  issuedOn: string
}

/** How a document is called everywhere: "Q-1001 A". */
export function quoteTitle({ quote }: QuoteDocument): string {
  return `${quote.number} ${quote.current.letter}`
}
