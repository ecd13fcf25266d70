import { leastLeg } from '../base/fillet.ts'
import type { Finish, LineSpec, PlateSpec, WeldSpec } from '../pricing/line-spec.ts'
import type { Section } from '../sections/section.ts'
import { MM_PER_INCH } from '../units/convert.ts'

/** What a designed base contributes; the answer of a base-plate design fits. */
export interface ChosenBase {
  plate: { length: number; width: number; thickness: number }
  rods: { count: number; diameter: number; grade: string }
  holes: { count: number; diameter: number }
  welds: { leg: number; length: number }
}

export interface ChosenLine {
  mark: string
  quantity: number
  section: Section
  grade: string
  /** Overall height, mm. */
  height: number
  finish: Finish
  /** null: no base plate. */
  base: ChosenBase | null
  /** Rods come with the column. */
  withRods: boolean
  /** A cap plate of the shop's own choice. */
  withCap: boolean
}

/** How a chosen shape is made unless the estimator says otherwise: the start of a line's price. */
export function lineSpecOf(chosen: ChosenLine): LineSpec {
  const { mark, quantity, section, grade, height, finish, base } = chosen
  const cap = chosen.withCap ? capPlateFor(section) : null
  const welds: WeldSpec[] = []
  if (base) welds.push({ where: 'base', leg: base.welds.leg, length: Math.ceil(base.welds.length) })
  if (cap) welds.push({ where: 'cap', leg: capWeldLeg(section, cap), length: Math.ceil(section.perimeter) })
  return {
    mark,
    quantity,
    section: section.designation,
    grade,
    height,
    finish,
    base: base && {
      length: base.plate.length,
      width: base.plate.width,
      thickness: base.plate.thickness,
      holes: { count: base.holes.count, diameter: base.holes.diameter },
    },
    cap,
    rods: base && chosen.withRods ? rodsOf(base) : null,
    welds,
    extras: [],
    overrides: [],
  }
}

function rodsOf({ rods: { count, diameter, grade } }: ChosenBase): LineSpec['rods'] {
  return { count, diameter, grade }
}

/** Standard hole of a ¾ in bolt: 13/16 in (AISC 360-22 Table J3.3). */
const CAP_HOLE = (13 / 16) * MM_PER_INCH

/** Shop practice: room for the fillet on each side, mm, and plates cut to the next 10 mm. */
const CAP_OVERHANG = 20
const CAP_MODULE = 10

/**
 * Cap plate by shop practice: the shape and an overhang all round, up to the next 10 mm; 12 mm thick to 200 mm,
 * 16 mm to 300 mm, 20 mm above; four holes on an I, two on a hollow shape to 200 mm and four above.
 */
export function capPlateFor({ depth, width, shape }: Section): PlateSpec {
  const side = (size: number) => Math.ceil((size + 2 * CAP_OVERHANG) / CAP_MODULE) * CAP_MODULE
  const [length, across] = [side(depth), side(width)]
  const largest = Math.max(length, across)
  return {
    length,
    width: across,
    thickness: largest <= 200 ? 12 : largest <= 300 ? 16 : 20,
    holes: { count: shape !== 'I' && largest <= 200 ? 2 : 4, diameter: CAP_HOLE },
  }
}

/** Least fillet leg by the thinner part joined, all round the outline by shop practice. mm. */
export function capWeldLeg(section: Section, cap: PlateSpec): number {
  return leastLeg(Math.min(section.shape === 'I' ? section.tf : section.wall, cap.thickness))
}
