import type { QuoteLineDto } from '../../shared/contracts/quotes.ts'
import { detailLabel, heightLabel } from '../../shared/drawing/labels.ts'
import { formatQuantity } from '../../shared/units/render.ts'
import type { UnitSystem } from '../../shared/units/step.ts'
import type { Fact } from './fact-columns.ts'
import { percent } from './figures.ts'
import { FINISH_WORDS } from './price-table.ts'

/** How a mark is made, each as a label and its words. */
export function makeFacts(line: QuoteLineDto, pieceMass: number | undefined, system: UnitSystem): Fact[] {
  const { spec, check, base } = line
  const label = (mm: number) => detailLabel(mm, system)
  const both = spec.section === line.designationSI ? spec.section : `${spec.section} (${line.designationSI})`
  const facts: Fact[] = [
    ['Section', both],
    ['Grade', spec.grade],
    ['Height made', heightLabel(spec.height, system)],
    ['Finish', FINISH_WORDS[spec.finish]],
  ]
  if (pieceMass !== undefined) facts.push(['Mass each', formatQuantity(pieceMass, 'kg', system)])
  if (spec.base) facts.push(['Base plate', plateText(spec.base, label)])
  if (spec.cap) facts.push(['Cap plate', plateText(spec.cap, label)])
  if (spec.rods)
    facts.push(['Anchor rods', `${spec.rods.count} of ${label(spec.rods.diameter)}, ${spec.rods.grade}`])
  for (const weld of spec.welds) {
    facts.push([`Weld at ${weld.where}`, `fillet ${label(weld.leg)} leg, ${label(weld.length)} long in all`])
  }
  for (const extra of spec.extras) facts.push(['Also', `${extra.quantity} × ${extra.description}`])
  facts.push(['Works at', `${percent(check.utilisation)} of its capacity`])
  if (base)
    facts.push(['Base works at', percent(Math.max(0, ...base.checks.map((item) => item.utilisation)))])
  return facts
}

function plateText(plate: NonNullable<QuoteLineDto['spec']['base']>, label: (mm: number) => string): string {
  const size = `${label(plate.length)} × ${label(plate.width)} × ${label(plate.thickness)}`
  if (plate.holes.count === 0) return size
  return `${size}, ${plate.holes.count} holes Ø ${label(plate.holes.diameter)}`
}
