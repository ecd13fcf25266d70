import type { CheckDto, ColumnCheckDto } from '../../shared/contracts/checks.ts'
import type { QuoteLineDto } from '../../shared/contracts/quotes.ts'
import { computedLengthLabel, heightLabel } from '../../shared/drawing/labels.ts'
import { formatQuantity, render } from '../../shared/units/render.ts'
import type { UnitSystem } from '../../shared/units/step.ts'
import type { Sheet } from './sheet.ts'
import { table, type Cell } from './table.ts'

/** The calculation of one mark: lengths by both methods, then every check with its steps. */
export function calculation(sheet: Sheet, line: QuoteLineDto, system: UnitSystem): void {
  // On a page of its own, unless the mark's sheet has just begun another.
  sheet.down(14)
  sheet.room(sheet.doc.page.height * 0.5)
  sheet.heading(`Calculation of ${line.mark}, ${line.spec.section}`)
  sheet.paragraph(governingText(line.check), 'reckon')
  sheet.down(8)
  lengthTable(sheet, line.check, system)
  for (const check of line.check.checks) checkSteps(sheet, check, system)
  braceNeeds(sheet, line.check, system)
  if (line.base) {
    sheet.down(6)
    sheet.heading(`Base plate of ${line.mark}`, 2, 120)
    for (const check of line.base.checks) checkSteps(sheet, check, system)
    if (line.base.notes.length > 0) sheet.list(line.base.notes, 'small')
    sheet.down(6)
  }
  listed(sheet, 'Warnings', line.check.warnings)
  listed(sheet, 'Assumed', line.check.assumptions)
  listed(sheet, 'Not covered', line.check.notCovered)
}

function governingText({ verdict, utilisation, governing }: ColumnCheckDto): string {
  const { check, clause, axis, combination } = governing
  const about = axis ? `, ${axis} axis` : ''
  const under = combination ? `, under ${combination}` : ''
  return `The shape ${verdict}: utilisation ${utilisation.toFixed(3)}, governed by ${check} (${clause})${about}${under}.`
}

function lengthTable(sheet: Sheet, { lengths }: ColumnCheckDto, system: UnitSystem): void {
  const label = (mm: number) => computedLengthLabel(mm, system)
  sheet.heading('Effective lengths', 3, 80)
  const rows = (['strong', 'weak'] as const).map((axis): Cell[] => {
    const { segment, eigenvalue, used, governedBy, segments, criticalLoad } = lengths[axis]
    const parts = segments.map(({ from, to, k, kl }) => {
      const where = `${heightLabel(from, system)} to ${heightLabel(to, system)}`
      return k === null || kl === null
        ? `${where}: no K of its own`
        : `${where}: ${k.toFixed(2)} · L = ${label(kl)}`
    })
    return [
      axis,
      parts.join('\n'),
      label(segment),
      label(eigenvalue),
      { text: label(used), under: governedBy === 'segment' ? 'segments govern' : 'eigenvalue governs' },
      formatQuantity(criticalLoad, 'N', system),
    ]
  })
  table(
    sheet,
    [
      { label: 'Axis', share: 0.7, style: 'reckonStrong' },
      { label: 'Segments, K·L', share: 2.6, style: 'reckon' },
      { label: 'By segments', share: 1, align: 'right', style: 'reckon' },
      { label: 'By eigenvalue', share: 1, align: 'right', style: 'reckon' },
      { label: 'Lc used', share: 1.2, align: 'right', style: 'reckonStrong' },
      { label: 'Elastic Pcr', share: 1, align: 'right', style: 'reckon' },
    ],
    rows,
  )
  sheet.down(3)
  sheet.paragraph(`Torsion: Lcz ${label(lengths.torsion.used)} between points that stop twist.`, 'reckonSoft')
  sheet.down(8)
}

/** What each brace must give: the shape is only as good as its braces. */
function braceNeeds(sheet: Sheet, { braces }: ColumnCheckDto, system: UnitSystem): void {
  if (braces.length === 0) return
  sheet.heading('What each brace must give', 3, 60)
  table(
    sheet,
    [
      { label: 'Brace at', share: 1, style: 'reckonStrong' },
      { label: 'Holding', share: 1, style: 'reckon' },
      { label: 'Strength', share: 1, align: 'right', style: 'reckon' },
      { label: 'Stiffness', share: 1, align: 'right', style: 'reckon' },
    ],
    braces.map(({ height, axis, strength, stiffness }) => [
      heightLabel(height, system),
      `${axis} axis`,
      formatQuantity(strength, 'N', system),
      formatQuantity(stiffness, 'N/mm', system),
    ]),
  )
  sheet.down(3)
  sheet.paragraph('AISC 360 Appendix 6.2, point bracing, for the governing compression.', 'reckonSoft')
  sheet.down(8)
}

function checkSteps(sheet: Sheet, check: CheckDto, system: UnitSystem): void {
  const holds = check.utilisation <= 1
  const [demand, capacity] = [check.demand, check.capacity].map((value) =>
    formatQuantity(value, check.unit, system),
  )
  const compared = `${demand} ${holds ? '≤' : '>'} ${capacity}: ${holds ? 'holds' : 'fails'}`
  sheet.heading(`${check.clause}  ${check.title}`, 3, 50)
  sheet.down(-2)
  sheet.paragraph(
    `${compared}, utilisation ${check.utilisation.toFixed(3)}`,
    holds ? 'reckonSoft' : 'reckonFails',
  )
  sheet.down(1)
  const steps = check.steps.map((step): Cell[] => [
    step.symbol,
    step.expression,
    render(step, system),
    formatQuantity(step.value, step.unit, system),
  ])
  if (steps.length > 0) {
    table(
      sheet,
      [
        { label: '', share: 0.8, style: 'reckonStrong' },
        { label: '', share: 2.1, style: 'reckon' },
        { label: '', share: 2.6, style: 'reckonSoft' },
        { label: '', share: 1.2, align: 'right', style: 'reckonStrong' },
      ],
      steps,
      { ruled: false, padding: 0.6 },
    )
  }
  if (check.notes.length > 0) sheet.list(check.notes, 'small')
  sheet.down(7)
}

function listed(sheet: Sheet, title: string, items: readonly string[]): void {
  if (items.length === 0) return
  sheet.heading(title, 3)
  sheet.list(items, 'small')
  sheet.down(6)
}
