import type { Check } from '../units/step.ts'
import type { BaseInput, BaseParts } from './base-design.ts'

/** A size that has to lie within another, mm. */
interface Fit {
  title: string
  inner: number
  outer: number
}

/** Sizes from inches are exact to this, mm. */
const TOLERANCE = 1e-6

/** Shaft on plate, and plate on pier: what of them does not fit. */
export function misfits({ section, concrete: { pier } }: BaseInput, { plate }: BaseParts): Fit[] {
  const fits: Fit[] = [
    { title: 'Length of the plate for the shaft', inner: section.depth, outer: plate.length },
    { title: 'Width of the plate for the shaft', inner: section.width, outer: plate.width },
  ]
  if (pier) {
    fits.push({ title: 'Length of the pier for the plate', inner: plate.length, outer: pier.length })
    fits.push({ title: 'Width of the pier for the plate', inner: plate.width, outer: pier.width })
  }
  return fits.filter(({ inner, outer }) => inner > outer + TOLERANCE)
}

export function roomChecks(input: BaseInput, parts: BaseParts): Check[] {
  return misfits(input, parts).map(({ title, inner, outer }) => ({
    clause: 'room',
    title,
    demand: inner,
    capacity: outer,
    unit: 'mm',
    utilisation: inner / outer,
    steps: [],
    notes: [`At least ${Math.ceil(inner)} mm.`],
  }))
}
