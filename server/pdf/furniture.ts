import { quoteTitle, type QuoteDocument } from './quote-document.ts'
import type { Sheet } from './sheet.ts'
import { INK } from './type-style.ts'

const RULE = 38
const BOB = 9

/** What every page bears, added when all are written: the plumb line down the left margin and the page's number. */
export function furnish(sheet: Sheet, document: QuoteDocument): void {
  const { doc } = sheet
  const { start, count } = doc.bufferedPageRange()
  for (let index = 0; index < count; index++) {
    doc.switchToPage(start + index)
    // The foot lies in the bottom margin, where text would otherwise start another page.
    doc.page.margins.bottom = 0
    doc.markContent('Artifact', { type: 'Pagination' })
    plumbLine(doc)
    const y = doc.page.height - 40
    sheet.put('label', document.shop.name, { y })
    const number = `${quoteTitle(document)} · page ${index + 1} of ${count}`
    sheet.put('label', number, { x: sheet.left, y, width: sheet.width, align: 'right' })
    doc.endMarkedContent()
  }
}

function plumbLine(doc: PDFKit.PDFDocument): void {
  const foot = doc.page.height - 46
  doc.moveTo(RULE, 0).lineTo(RULE, foot).lineWidth(0.7).strokeColor(INK.oxide).stroke()
  doc
    .polygon(
      [RULE - 3, foot],
      [RULE + 3, foot],
      [RULE + 3, foot + BOB * 0.5],
      [RULE, foot + BOB + 4],
      [RULE - 3, foot + BOB * 0.5],
    )
    .fill(INK.oxide)
}
