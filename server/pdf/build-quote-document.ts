import PDFDocument from 'pdfkit'
import { calculation } from './calculation.ts'
import { registerFaces } from './faces.ts'
import { furnish } from './furniture.ts'
import { letterhead } from './letterhead.ts'
import { markSheet } from './mark-sheet.ts'
import { priceTable } from './price-table.ts'
import { quoteTitle, type QuoteDocument } from './quote-document.ts'
import { Sheet } from './sheet.ts'

const MARGINS = { top: 52, bottom: 62, left: 62, right: 44 }

/** Writes the whole quote: offer, terms, a sheet and a calculation for each mark. Runs anywhere, takes a while. */
export function buildQuoteDocument(document: QuoteDocument): Promise<Buffer> {
  const { quote, shop, issuedOn } = document
  const made = new Date(issuedOn)
  const doc = new PDFDocument({
    size: shop.paper === 'Letter' ? 'LETTER' : 'A4',
    margins: MARGINS,
    bufferPages: true,
    tagged: true,
    pdfVersion: '1.7',
    lang: 'en',
    displayTitle: true,
    info: {
      Title: `Quote ${quoteTitle(document)}`,
      Author: shop.name,
      Subject: `Columns for ${quote.company.name}`,
      CreationDate: made,
      ModDate: made,
    },
  })
  const pieces: Buffer[] = []
  const finished = new Promise<Buffer>((resolve, reject) => {
    doc.on('data', (piece: Buffer) => pieces.push(piece))
    doc.on('end', () => resolve(Buffer.concat(pieces)))
    doc.on('error', reject)
  })
  registerFaces(doc)
  const sheet = new Sheet(doc)
  letterhead(sheet, document)
  sheet.down(14)
  priceTable(sheet, document)
  terms(sheet, document)
  const masses = quote.current.price.lines.map((line) => line.pieceMass)
  quote.current.lines.forEach((line, index) => {
    markSheet(sheet, line, masses[index], shop.system)
    calculation(sheet, line, shop.system)
  })
  furnish(sheet, document)
  sheet.close()
  doc.end()
  return finished
}

function terms(sheet: Sheet, { quote }: QuoteDocument): void {
  const parts: [string, string[]][] = [
    ['What the price is based on', quote.basis],
    ['Not included', quote.exclusions],
    ['Read before you build', quote.cautions],
  ]
  for (const [title, items] of parts) {
    if (items.length === 0) continue
    sheet.down(10)
    sheet.heading(title, 3, 50)
    sheet.list(items)
  }
}
