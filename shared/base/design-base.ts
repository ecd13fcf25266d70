import { rodSteel } from '../materials/plate-steels.ts'
import type { Method } from '../standards/aisc360/resistance.ts'
import { Refusal, type Issue } from '../units/refusal.ts'
import type { BaseDesign, BaseInput, BaseParts } from './base-design.ts'
import { compressionChecks } from './compression-checks.ts'
import { leastLeg } from './fillet.ts'
import { enPlateChecks } from './en-plate.ts'
import { findBase, wallOf } from './find-base.ts'
import { rodChecks } from './rod-checks.ts'
import { FEWEST_RODS, POST_WEIGHT } from './rods.ts'
import { weldChecks } from './weld-checks.ts'

const NOT_COVERED =
  'Concrete breakout, pull-out and shear at the anchor rods, and the footing itself, are not covered here: the engineer of record designs them.'

/** Everything that cannot be taken, each with its field. */
export function issuesOf({ section, required, concrete, plate, rods, stock }: BaseInput): Issue[] {
  const issues: Issue[] = []
  const say = (path: string, message: string) => issues.push({ path, message })
  if (!(required.compression >= 0)) say('required.compression', 'newtons, 0 or more')
  if (!(required.uplift >= 0)) say('required.uplift', 'newtons, 0 or more; uplift is positive here')
  if (required.compression === 0 && required.uplift === 0) say('required', 'compression or uplift above 0')
  if (!(concrete.strength > 0)) say('concrete.strength', 'cylinder strength in MPa, more than 0')
  if (rods?.grade !== undefined && !rodSteel(rods.grade)) {
    say('rods.grade', 'F1554-36, F1554-55 or F1554-105')
  }
  if (stock.thicknesses.length === 0) say('stock.thicknesses', 'at least one plate thickness')
  const size = { length: plate?.length, width: plate?.width }
  if (size.length !== undefined && size.length < section.depth) {
    say('plate.length', `at least the depth of ${section.designation}, ${Math.ceil(section.depth)} mm`)
  }
  if (size.width !== undefined && size.width < section.width) {
    say('plate.width', `at least the width of ${section.designation}, ${Math.ceil(section.width)} mm`)
  }
  const { pier } = concrete
  if (pier && (pier.length < section.depth || pier.width < section.width)) {
    say('concrete.pier', `at least as large as ${section.designation}`)
  } else if (pier && ((size.length ?? 0) > pier.length || (size.width ?? 0) > pier.width)) {
    say('concrete.pier', 'at least as large as the plate')
  }
  return issues
}

function notesOf(parts: BaseParts, { standard, section, required, weight }: BaseInput): string[] {
  const notes = [NOT_COVERED]
  if (standard === 'EN 1993-1-1')
    notes.push('Anchor rods and weld are checked by AISC 360, LRFD, whose margins are those of EN 1993-1-8.')
  if (required.compression > 0) {
    notes.push(
      'Compression goes into the plate by bearing of the sawn end of the shaft; the weld holds it in place.',
    )
  }
  if (weight !== undefined && weight <= POST_WEIGHT) {
    notes.push('It weighs 300 lb or less: by 29 CFR 1926.751 it is a post, and need not have four rods.')
  }
  const { count } = parts.rods
  if (count >= FEWEST_RODS) {
    notes.push(`${count} rods; a column needs at least four by 29 CFR 1926.755(a)(1).`)
  }
  const thinner = Math.min(wallOf(section), parts.plate.thickness)
  notes.push(
    `Fillet of ${parts.leg} mm all round; AISC 360 Table J2.4 asks for ${leastLeg(thinner)} mm where the thinner part is ${thinner.toFixed(1)} mm.`,
  )
  notes.push(
    `Holes are ${parts.hole.toFixed(0)} mm, oversize for setting: each rod has a plate washer over them.`,
  )
  return notes
}

/**
 * Base plate, anchor rods and weld of a column in simple framing: bearing J8, plate by Design Guide 1, four rods and the
 * erection load of 29 CFR 1926.755, fillet J2; under EN the plate by EN 1993-1-8 6.2.5. What is given is checked, the rest is found. Refuses by field.
 */
export function designBase(input: BaseInput): BaseDesign {
  const issues = issuesOf(input)
  if (issues.length > 0) throw new Refusal(issues)
  const method: Method = input.method ?? 'LRFD'
  const parts = findBase(input, method)
  const compression =
    input.standard === 'EN 1993-1-1' ? enPlateChecks(input, parts) : compressionChecks(input, parts, method)
  const rods = rodChecks(input, parts, method)
  const welds = weldChecks(input, parts, method)
  const checks = [...compression.checks, ...rods.checks, ...welds.checks]
  return {
    verdict: checks.every(({ utilisation }) => utilisation <= 1) ? 'holds' : 'fails',
    plate: parts.plate,
    rods: parts.rods,
    holes: { count: parts.rods.count, diameter: parts.hole },
    welds: { leg: parts.leg, length: input.section.perimeter },
    values: { ...compression.values, ...rods.values, ...welds.values },
    checks,
    notes: notesOf(parts, input),
  }
}
