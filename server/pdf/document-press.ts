import { Piscina } from 'piscina'
import type { QuoteDocument } from './quote-document.ts'

export interface DocumentPress {
  /** The document of a quote as PDF. */
  renderQuoteDocument: (document: QuoteDocument) => Promise<Buffer>
  /** Ends the worker; documents under way are lost. */
  close: () => Promise<void>
}

/** A worker's faces stay warm for this long after its last document, ms. */
const IDLE = 10 * 60_000

/** Writes documents in a worker of its own, so that a long one holds up nobody's request. */
export function createDocumentPress(workerFile: string): DocumentPress {
  const pool = new Piscina<QuoteDocument, Uint8Array>({
    filename: workerFile,
    execArgv: workerFile.endsWith('.ts') ? ['--import', 'tsx'] : [],
    minThreads: 0,
    maxThreads: 1,
    idleTimeout: IDLE,
  })
  return {
    async renderQuoteDocument(document) {
      const bytes = await pool.run(document)
      return Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength)
    },
    close: () => pool.destroy(),
  }
}
