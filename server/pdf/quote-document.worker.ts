import { buildQuoteDocument } from './build-quote-document.ts'
import type { QuoteDocument } from './quote-document.ts'

/** Piscina's task: a quote in, the bytes of its document out. */
export default function work(document: QuoteDocument): Promise<Uint8Array> {
  return buildQuoteDocument(document)
}
