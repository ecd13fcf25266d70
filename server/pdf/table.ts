import type { Align, Sheet } from './sheet.ts'
import { INK, type StyleName } from './type-style.ts'

export interface Column {
  label: string
  /** Part of the table's width. */
  share: number
  align?: Align
  style?: StyleName
}

/** A cell may have a second, smaller line. */
export type Cell = string | { text: string; under: string }
export interface TableOptions {
  x?: number
  width?: number
  /** The hairline under each row is left out in calculations. */
  ruled?: boolean
  padding?: number
}

const GUTTER = 8

/** A table whose head is repeated at the top of each page that it reaches. */
export function table(sheet: Sheet, columns: Column[], rows: Cell[][], options: TableOptions = {}): void {
  const { x = sheet.left, width = sheet.width, ruled = true, padding = 3.5 } = options
  const shares = columns.reduce((sum, column) => sum + column.share, 0)
  let at = x
  const places = columns.map((column) => {
    const place = { ...column, x: at, width: (column.share / shares) * width - GUTTER }
    at += place.width + GUTTER
    // The last column reaches the edge.
    return column === columns.at(-1) ? { ...place, width: x + width - place.x } : place
  })
  const line = (y: number, weight: number, colour: string) =>
    sheet.artifact(() => {
      sheet.doc
        .moveTo(x, y)
        .lineTo(x + width, y)
        .lineWidth(weight)
        .strokeColor(colour)
        .stroke()
    })
  const heights = rows.map((row) => rowHeight(sheet, places, row) + 2 * padding)

  const head = (tagged: boolean) => {
    const y = sheet.y
    const cell = (place: (typeof places)[number]) =>
      sheet.put('label', place.label, { x: place.x, y, width: place.width, align: place.align ?? 'left' })
    if (tagged) {
      sheet.group('TR', () => {
        for (const place of places) sheet.tag('TH', () => cell(place), { scope: 'Column' })
      })
    } else sheet.artifact(() => places.forEach(cell))
    sheet.moveTo(y + 12)
    line(sheet.y, 0.8, INK.ink)
  }

  sheet.room(14 + (heights[0] ?? 0))
  sheet.group('Table', () => {
    if (columns.some((column) => column.label)) head(true)
    rows.forEach((row, index) => {
      const height = heights[index] ?? 0
      if (sheet.room(height) && columns.some((column) => column.label)) head(false)
      const y = sheet.y
      sheet.group('TR', () => row.forEach((cell, place) => drawCell(sheet, places[place], cell, y + padding)))
      sheet.moveTo(y + height)
      if (ruled) line(sheet.y, 0.4, INK.hair)
    })
  })
}

type Place = Column & { x: number; width: number }

function rowHeight(sheet: Sheet, places: Place[], row: Cell[]): number {
  const heights = row.map((cell, index) => {
    const place = places[index]
    if (!place) return 0
    const { text, under } = typeof cell === 'string' ? { text: cell, under: '' } : cell
    const first = sheet.heightOf(place.style ?? 'body', text, place.width)
    return first + (under ? sheet.heightOf('label', under, place.width) : 0)
  })
  return Math.max(...heights)
}

function drawCell(sheet: Sheet, place: Place | undefined, cell: Cell, y: number): void {
  if (!place) return
  const { text, under } = typeof cell === 'string' ? { text: cell, under: '' } : cell
  const { x, width, align = 'left', style = 'body' } = place
  if (!under) {
    sheet.tag('TD', () => sheet.put(style, text, { x, y, width, align }))
    return
  }
  sheet.group('TD', () => {
    sheet.tag('P', () => sheet.put(style, text, { x, y, width, align }))
    sheet.tag('P', () => sheet.put('label', under, { x, width, align }))
  })
}
