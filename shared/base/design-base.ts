import { rodSteel } from '../materials/plate-steels.ts'
import type { Method } from '../standards/aisc360/resistance.ts'
import { Refusal, type Issue } from '../units/refusal.ts'
import type { BaseDesign, BaseInput, BaseParts } from './base-design.ts'
import { compressionChecks } from './compression-checks.ts'
import { leastLeg } from './fillet.ts'
import { enPlateChecks } from './en-plate.ts'
import { findBase, wallOf } from './find-base.ts'
import { roomChecks } from './room-checks.ts'
import { rodChecks } from './rod-checks.ts'
import { FEWEST_RODS, isPost } from './rods.ts'
import { weldChecks } from './weld-checks.ts'

const NOT_COVERED =
  'Concrete breakout, pull-out and shear at the anchor rods, and the footing itself, are not covered here: the engineer of record designs them.'

/** Everything that cannot be taken, each with its field. What is merely too small is checked, and fails. */
export function issuesOf({ required, concrete, plate = {}, rods = {}, stock }: BaseInput): Issue[] {
  const issues: Issue[] = []
  const say = (path: string, message: string) => issues.push({ path, message })
  const positive = (path: string, value: number | undefined, message: string) => {
    if (value !== undefined && !(Number.isFinite(value) && value > 0)) say(path, message)
  }
  const { compression, uplift } = required
  if (!(Number.isFinite(compression) && compression >= 0)) say('required.compression', 'newtons, 0 or more')
  if (!(Number.isFinite(uplift) && uplift >= 0)) {
    say('required.uplift', 'newtons, 0 or more; uplift is positive here')
  }
  if (compression === 0 && uplift === 0) say('required', 'compression or uplift above 0')
  positive('concrete.strength', concrete.strength, 'cylinder strength in MPa, more than 0')
  positive('concrete.pier.length', concrete.pier?.length, 'mm, more than 0')
  positive('concrete.pier.width', concrete.pier?.width, 'mm, more than 0')
  positive('plate.length', plate.length, 'mm, more than 0')
  positive('plate.width', plate.width, 'mm, more than 0')
  positive('plate.thickness', plate.thickness, 'mm, more than 0')
  positive('plate.yield', plate.yield, 'yield strength in MPa, more than 0')
  positive('rods.diameter', rods.diameter, 'mm, more than 0')
  if (rods.count !== undefined && !(Number.isInteger(rods.count) && rods.count >= 1)) {
    say('rods.count', 'a whole number of at least 1')
  }
  if (rods.grade !== undefined && !rodSteel(rods.grade)) {
    say('rods.grade', 'F1554-36, F1554-55 or F1554-105')
  }
  if (stock.thicknesses.length === 0) say('stock.thicknesses', 'at least one plate thickness')
  if (stock.rodDiameters.length === 0) say('stock.rodDiameters', 'at least one rod')
  return issues
}

/** Rods and weld under EN are checked by AISC 360, LRFD. */
export function methodOf({ standard, method = 'LRFD' }: BaseInput): Method {
  return standard === 'EN 1993-1-1' ? 'LRFD' : method
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
  if (isPost(weight)) {
    notes.push(
      'It weighs 300 lb or less: by 29 CFR 1926.751 it is a post, and 1926.755(a) asks neither four rods nor the erection load of it.',
    )
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
 * erection load of 29 CFR 1926.755, fillet J2; under EN the plate by EN 1993-1-8 6.2.5. What is given is checked as it is,
 * the rest is found. N, mm, MPa. Refuses by field.
 */
export function designBase(input: BaseInput): BaseDesign {
  const issues = issuesOf(input)
  if (issues.length > 0) throw new Refusal(issues)
  const method = methodOf(input)
  const parts = findBase(input, method)
  const compression =
    input.standard === 'EN 1993-1-1' ? enPlateChecks(input, parts) : compressionChecks(input, parts, method)
  const rods = rodChecks(input, parts, method)
  const welds = weldChecks(input, parts, method)
  const checks = [...roomChecks(input, parts), ...compression.checks, ...rods.checks, ...welds.checks]
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
