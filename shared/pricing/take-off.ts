import type { Section } from '../sections/section.ts'
import { exact, sum, type Exact } from './exact.ts'
import type { LineSpec, PlateSpec } from './line-spec.ts'

/** What of a shape makes its price: names, kg/m, mm², mm. */
export type PricedSection = Pick<Section, 'designation' | 'family' | 'mass' | 'area' | 'perimeter'>

/** Density of structural steel for weighing, kg/m³ (EN 1991-1-1 Table A.4 gives 77–78.5 kN/m³; trade value). */
const STEEL_DENSITY = 7850

export interface PlateTakeOff {
  where: 'base' | 'cap'
  length: number
  width: number
  thickness: number
  /** kg */
  mass: Exact
  /** Cut edge, m. */
  edge: Exact
  /** Both faces and the edges, m². */
  painted: Exact
  holes: number
}

/** Quantities of one piece. */
export interface TakeOff {
  /** Cut length of the shaft: overall height less the plates, mm. */
  shaftLength: Exact
  /** kg */
  shaftMass: Exact
  plateMass: Exact
  pieceMass: Exact
  /** Area that a saw cut goes through, mm². */
  sawnArea: Exact
  /** m² */
  paintedArea: Exact
  plates: PlateTakeOff[]
  /** Fillets by leg, length in m. */
  welds: { leg: number; length: Exact }[]
  rods: { count: number; diameter: number } | null
}

function takeOffPlate(where: 'base' | 'cap', plate: PlateSpec): PlateTakeOff {
  const { length, width, thickness, holes } = plate
  const [l, w, t] = [metres(length), metres(width), metres(thickness)]
  const around = l.plus(w).times(2)
  return {
    where,
    length,
    width,
    thickness,
    mass: l.times(w).times(t).times(STEEL_DENSITY),
    edge: around,
    painted: l.times(w).times(2).plus(around.times(t)),
    holes: holes.count,
  }
}

/**
 * Quantities of one piece of a line. Shaft = mass per metre × cut length; plate = length × width × thickness ×
 * 7850 kg/m³; painted area = outline × cut length + both faces and edges of the plates. Nothing is rounded.
 */
export function takeOff(section: PricedSection, spec: LineSpec): TakeOff {
  const plates: PlateTakeOff[] = []
  if (spec.base) plates.push(takeOffPlate('base', spec.base))
  if (spec.cap) plates.push(takeOffPlate('cap', spec.cap))
  const shaftLength = exact(spec.height).minus(sum(plates.map(({ thickness }) => exact(thickness))))
  const shaft = shaftLength.div(1000)
  const shaftMass = shaft.times(section.mass)
  const plateMass = sum(plates.map(({ mass }) => mass))
  return {
    shaftLength,
    shaftMass,
    plateMass,
    pieceMass: shaftMass.plus(plateMass),
    sawnArea: exact(section.area),
    paintedArea: metres(section.perimeter)
      .times(shaft)
      .plus(sum(plates.map(({ painted }) => painted))),
    plates,
    welds: spec.welds.map(({ leg, length }) => ({ leg, length: metres(length) })),
    rods: spec.rods && { count: spec.rods.count, diameter: spec.rods.diameter },
  }
}

function metres(millimetres: number): Exact {
  return exact(millimetres).div(1000)
}

/** A length for reading: to a tenth of a millimetre. */
export function size(millimetres: number): string {
  return String(Math.round(millimetres * 10) / 10)
}
