import { rodSteel } from '../materials/plate-steels.ts'
import type { Section } from '../sections/section.ts'
import type { Method } from '../standards/aisc360/resistance.ts'
import type { BaseInput, BaseParts, Plate, PlateSize } from './base-design.ts'
import { availableBearing, confinement } from './bearing.ts'
import { cantilevers, thicknessRequired, upliftThickness } from './cantilever.ts'
import { plateResistance } from './en-plate.ts'
import { filletAvailable, leastLeg } from './fillet.ts'
import { layOutRods, leastPlate, PLATE_MODULE, upToModule } from './rod-layout.ts'
import { erectionMoment, erectionTension, FEWEST_RODS, rodAvailable, rodRoom } from './rods.ts'

/** A36. */
const PLATE_YIELD = 248.2
const ROD_GRADE = 'F1554-36'
/** No plate of a column is larger, mm. */
const LARGEST = 3000

export function wallOf(section: Section): number {
  return section.shape === 'I' ? section.tf : section.wall
}

/** Least leg by the thinner part, more where uplift asks for it, by whole millimetres. */
export function legFor(section: Section, thickness: number, uplift: number, method: Method): number {
  let leg = leastLeg(Math.min(wallOf(section), thickness))
  while (leg < 25 && filletAvailable(leg, section.perimeter, method) < uplift) leg += 1
  return leg
}

/** Smallest rod in stock that carries its share of the uplift and of the erection load; the largest where none does. */
function findRod(
  { section, required, stock }: BaseInput,
  count: number,
  grade: string,
  method: Method,
): number {
  const Fu = rodSteel(grade)?.Fu ?? 0
  const erection = erectionTension(erectionMoment(section.depth), Math.floor(count / 2), section.depth)
  const demand = Math.max(required.uplift / count, erection)
  const fitting = stock.rodDiameters.find((diameter) => rodAvailable(Fu, diameter, method) >= demand)
  return fitting ?? stock.rodDiameters.at(-1) ?? 19.05
}

/** Plan that has room for the rods and bears on the concrete, no larger than the pier: grown evenly on all sides. */
function findPlan(input: BaseInput, least: PlateSize, method: Method): PlateSize {
  const { concrete, required, plate = {} } = input
  const most = concrete.pier ?? { length: LARGEST, width: LARGEST }
  let length = plate.length ?? Math.min(upToModule(least.length), downToModule(most.length))
  let width = plate.width ?? Math.min(upToModule(least.width), downToModule(most.width))
  const bears = () => bearingOf(input, { length, width }, method) >= required.compression
  while (!bears()) {
    const longer = plate.length === undefined && length + PLATE_MODULE <= most.length
    const wider = plate.width === undefined && width + PLATE_MODULE <= most.width
    if (!longer && !wider) break
    if (longer) length += PLATE_MODULE
    if (wider) width += PLATE_MODULE
  }
  return { length, width }
}

function downToModule(length: number): number {
  return Math.max(PLATE_MODULE, Math.floor(length / PLATE_MODULE) * PLATE_MODULE)
}

/** A plate grows until it bears with no more than this thickness, by EN, where the two go together; mm. */
const USUAL_THICKNESS = 40

/** What the concrete under a plate of this plan can take, N. */
function bearingOf(input: BaseInput, plan: PlateSize, method: Method): number {
  const { section, concrete, plate, stock } = input
  if (input.standard === 'EN 1993-1-1') {
    const usual = stock.thicknesses.findLast((one) => one <= USUAL_THICKNESS) ?? USUAL_THICKNESS
    return plateResistance(
      section,
      plate?.thickness ?? usual,
      plate?.yield ?? PLATE_YIELD,
      concrete.strength,
      plan,
    )
  }
  const confined = confinement(plan, concrete.pier)
  return availableBearing(concrete.strength, plan.length * plan.width, confined, method)
}

/** Up the list of what is stocked; the thickest where none does. */
function findThickness(input: BaseInput, plan: PlateSize, Fy: number, count: number, method: Method): number {
  const { section, required, stock, concrete } = input
  const pulled = upliftThickness(required.uplift / count, Fy, method)
  const { l } = cantilevers(section, plan, required.compression / bearingOf(input, plan, method))
  const needed = thicknessRequired(l, required.compression, Fy, plan, method)
  const bears = (thickness: number) =>
    input.standard === 'EN 1993-1-1'
      ? plateResistance(section, thickness, Fy, concrete.strength, plan) >= required.compression
      : thickness >= needed
  const found = stock.thicknesses.find((thickness) => thickness >= pulled && bears(thickness))
  return found ?? stock.thicknesses.at(-1) ?? 25
}

/** Everything that was not given, found; what was given, as it is. */
export function findBase(input: BaseInput, method: Method): BaseParts {
  const { section, required, rods: given = {}, plate: asked = {} } = input
  const count = given.count ?? FEWEST_RODS
  const grade = given.grade ?? ROD_GRADE
  const diameter = given.diameter ?? findRod(input, count, grade, method)
  const Fy = asked.yield ?? PLATE_YIELD
  // The leg is by the wall unless the plate is thinner; the plan leaves room for either.
  const room = legFor(section, wallOf(section), required.uplift, method)
  const plan = findPlan(input, leastPlate(section, diameter, room, Math.ceil(count / 2)), method)
  const thickness = asked.thickness ?? findThickness(input, plan, Fy, count, method)
  const plate: Plate = { ...plan, thickness, yield: Fy }
  const leg = legFor(section, thickness, required.uplift, method)
  const positions = layOutRods(section, plan, { count, diameter }, leg) ?? []
  return { plate, rods: { count, diameter, grade, positions }, hole: rodRoom(diameter).hole, leg }
}
