import { buildQuoteDocument } from './build-quote-document.ts'
import type { QuoteDocument } from './quote-document.ts'

/** The document of a quote as PDF. */
export function renderQuoteDocument(document: QuoteDocument): Promise<Buffer> {
  return buildQuoteDocument(document)
}
