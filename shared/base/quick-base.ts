import { rodSteel } from '../materials/plate-steels.ts'
import type { Method } from '../standards/aisc360/resistance.ts'
import type { BaseInput, BaseParts } from './base-design.ts'
import { availableBearing, confinement } from './bearing.ts'
import { cantilevers, thicknessRequired, upliftThickness } from './cantilever.ts'
import { issuesOf, methodOf } from './design-base.ts'
import { plateResistance } from './en-plate.ts'
import { filletAvailable } from './fillet.ts'
import { worstErection } from './erection.ts'
import { findBase } from './find-base.ts'
import { misfits } from './room-checks.ts'
import { FEWEST_RODS, isPost, rodAvailable } from './rods.ts'

/** What `designBase` would find, on numbers alone; undefined where it would not hold or would be refused. */
export function quickBase(input: BaseInput): BaseParts | undefined {
  if (issuesOf(input).length > 0) return undefined
  const method = methodOf(input)
  const parts = findBase(input, method)
  const { required, section, weight } = input
  const { plate, rods, leg } = parts
  const capacity = rodAvailable(rodSteel(rods.grade)?.Fu ?? 0, rods.diameter, method)
  const erection = worstErection(section, parts)
  const holds =
    misfits(input, parts).length === 0 &&
    plateHolds(input, parts, method) &&
    rods.positions.length > 0 &&
    (isPost(weight) ||
      (rods.count >= FEWEST_RODS && erection !== undefined && erection.tension <= capacity)) &&
    required.uplift / rods.count <= capacity &&
    upliftThickness(required.uplift / rods.count, plate.yield, method) <= plate.thickness &&
    required.uplift <= filletAvailable(leg, section.perimeter, method)
  return holds ? parts : undefined
}

function plateHolds(
  { standard, section, required, concrete }: BaseInput,
  { plate }: BaseParts,
  method: Method,
): boolean {
  const P = required.compression
  if (standard === 'EN 1993-1-1') {
    return plateResistance(section, plate.thickness, plate.yield, concrete.strength, plate) >= P
  }
  const confined = confinement(plate, concrete.pier)
  const bearing = availableBearing(concrete.strength, plate.length * plate.width, confined, method)
  const { l } = cantilevers(section, plate, P / bearing)
  return P <= bearing && thicknessRequired(l, P, plate.yield, plate, method) <= plate.thickness
}
