import { bound } from './figures.ts'
import type { Sheet } from './sheet.ts'

export type Fact = [label: string, text: string]

/** Labels and what they stand for, in two columns read downwards, kept together with their title. */
export function factColumns(sheet: Sheet, given: readonly Fact[], title?: string): void {
  const columns = 2
  const facts = given.map(([name, text]): Fact => [name, bound(text)])
  const gap = 18
  const label = 70
  const width = (sheet.width - gap * (columns - 1)) / columns
  const perColumn = Math.ceil(facts.length / columns)
  const heights = facts.map(([, text]) => sheet.heightOf('body', text, width - label))
  const tallest = Math.max(
    ...Array.from({ length: columns }, (_, column) =>
      heights
        .slice(column * perColumn, (column + 1) * perColumn)
        .reduce((sum, height) => sum + height + 3, 0),
    ),
  )
  sheet.room(tallest + (title ? 18 : 0))
  if (title) sheet.heading(title, 3, 0)
  const top = sheet.y
  sheet.group('L', () => {
    for (let column = 0; column < columns; column++) {
      const x = sheet.left + column * (width + gap)
      let y = top
      facts.slice(column * perColumn, (column + 1) * perColumn).forEach(([name, text], index) => {
        sheet.group('LI', () => {
          sheet.tag('Lbl', () => sheet.put('label', name, { x, y: y + 1.5, width: label - 6 }))
          sheet.tag('LBody', () => sheet.put('body', text, { x: x + label, y, width: width - label }))
        })
        y += (heights[column * perColumn + index] ?? 0) + 3
      })
    }
  })
  sheet.moveTo(top + tallest)
}
