import type { QuoteLineDto } from '../../shared/contracts/quotes.ts'
import { heightLabel } from '../../shared/drawing/labels.ts'
import { formatQuantity } from '../../shared/units/render.ts'
import { dateText, moneyText } from '../money-and-dates.ts'
import type { QuoteDocument } from './quote-document.ts'
import type { Sheet } from './sheet.ts'
import { table, type Cell } from './table.ts'
import { INK } from './type-style.ts'

export const FINISH_WORDS = {
  none: 'as rolled',
  prime: 'primed',
  paint: 'painted',
  galvanise: 'hot-dip galvanised',
} as const

/** What is offered and what it costs the customer: prices only, never how they came about. */
export function priceTable(sheet: Sheet, { quote, shop }: QuoteDocument): void {
  const { lines, price } = quote.current
  sheet.heading('What is offered', 2, 90)
  table(
    sheet,
    [
      { label: 'Mark', share: 1, style: 'strong' },
      { label: 'Pieces', share: 0.7, align: 'right' },
      { label: 'Section', share: 1.6 },
      { label: 'Height', share: 1.1 },
      { label: 'Finish', share: 1.3 },
      { label: 'Price each', share: 1.4, align: 'right' },
      { label: 'Price', share: 1.5, align: 'right' },
    ],
    lines.map((line, index): Cell[] => {
      const priced = price.lines[index]
      return [
        line.mark,
        String(line.spec.quantity),
        sectionCell(line),
        heightLabel(line.spec.height, shop.system),
        FINISH_WORDS[line.spec.finish],
        priced ? moneyText(priced.unitPrice) : '',
        priced ? moneyText(priced.linePrice) : '',
      ]
    }),
  )
  totals(sheet, quote.current)
  sheet.down(10)
  const until = quote.current.validUntil ? ` until ${dateText(quote.current.validUntil)}` : ''
  const mass = formatQuantity(price.mass, 'kg', shop.system)
  sheet.paragraph(
    `Mass of the whole work ${mass}. The price holds${until}; after that it can only be repriced. To accept, use the ` +
      `private link in the e-mail that brought this quote, under your own name. The deposit of ` +
      `${moneyText(price.deposit)} is due on acceptance, and no steel is ordered before it is in, unless credit terms ` +
      `were agreed.`,
    'small',
  )
}

export function sectionCell(line: QuoteLineDto): Cell {
  const { section } = line.spec
  return section === line.designationSI ? section : { text: section, under: line.designationSI }
}

function totals(sheet: Sheet, { price }: QuoteDocument['quote']['current']): void {
  const { delivery, tax, total, deposit } = price
  const trucks = delivery.trucks === 1 ? '1 truck' : `${delivery.trucks} trucks`
  const beforeTax = { ...total, amount: total.amount - tax.amount.amount }
  const taxName = tax.exempt ? 'Tax, exempt by certificate' : `Tax ${rateText(tax.rate)}`
  const rows: [string, string][] = [
    [
      delivery.trucks === 0
        ? 'Collected from the shop'
        : `Delivery, ${Math.round(delivery.km)} km, ${trucks}`,
      moneyText(delivery.price),
    ],
    ['Before tax', moneyText(beforeTax)],
    [taxName, moneyText(tax.amount)],
    ['Total', moneyText(total)],
    ['Deposit on acceptance', moneyText(deposit)],
  ]
  const x = sheet.left + sheet.width * 0.5
  sheet.room(rows.length * 17 + 10)
  sheet.group('Table', () => {
    for (const [name, amount] of rows) {
      const style = name === 'Total' ? 'strong' : 'body'
      const y = sheet.y + 4
      sheet.group('TR', () => {
        sheet.tag('TH', () => sheet.put(style, name, { x, y }), { scope: 'Row' })
        sheet.tag('TD', () => sheet.put(style, amount, { x, y, width: sheet.right - x, align: 'right' }))
      })
      sheet.moveTo(y + 13)
      const weight = name === 'Before tax' || name === 'Total' ? 0.8 : 0.4
      sheet.artifact(() => {
        sheet.doc.moveTo(x, sheet.y).lineTo(sheet.right, sheet.y).lineWidth(weight)
        sheet.doc.strokeColor(weight > 0.5 ? INK.ink : INK.hair).stroke()
      })
    }
  })
}

/** "8.25 %" of "0.0825". */
function rateText(rate: string): string {
  return `${Number((Number(rate) * 100).toFixed(3))} %`
}
