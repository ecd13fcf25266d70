import type { Section } from '../sections/section.ts'
import { makeStep } from '../units/render.ts'
import type { Check, Quantity } from '../units/step.ts'
import type { BaseInput, BaseParts, PlateSize } from './base-design.ts'

/** Foundation joint material coefficient and factors of EN 1993-1-8 6.2.5 and EN 1992-1-1; α = 1: no spread is counted on. */
const BETA_J = 2 / 3
const ALPHA = 1
const ALPHA_CC = 0.85
const GAMMA_C = 1.5
const GAMMA_M0 = 1

/** fjd = βj·α·αcc·fck/γC, MPa. EN 1993-1-8 Eq. 6.6 with EN 1992-1-1 3.1.6. */
export function jointStrength(fck: number): number {
  return (BETA_J * ALPHA * ALPHA_CC * fck) / GAMMA_C
}

/** Additional bearing width: c = t·√(fy/(3·fjd·γM0)), mm. EN 1993-1-8 Eq. 6.5. */
export function bearingWidth(t: number, fy: number, fjd: number): number {
  return t * Math.sqrt(fy / (3 * fjd * GAMMA_M0))
}

/**
 * Area of the plate that bears: the outline of the section grown by c on every side, no larger than the plate. mm².
 * EN 1993-1-8 6.2.5, Figure 6.4.
 */
export function bearingArea(section: Section, c: number, plate: PlateSize): number {
  const { depth, width } = section
  const along = (size: number) => Math.min(plate.length, size)
  const across = (size: number) => Math.min(plate.width, size)
  const whole = along(depth + 2 * c) * across(width + 2 * c)
  switch (section.shape) {
    case 'I': {
      const { tf, tw } = section
      // What lies between the grown flanges beside the grown web bears nothing.
      const gap = Math.max(0, depth - 2 * tf - 2 * c)
      const empty = Math.max(0, across(width + 2 * c) - (tw + 2 * c))
      return whole - gap * empty
    }
    case 'box': {
      const inside = (size: number) => Math.max(0, size - 2 * section.wall - 2 * c)
      return whole - inside(depth) * inside(width)
    }
    case 'round': {
      const outer = Math.min(depth + 2 * c, plate.length, plate.width)
      const inner = Math.max(0, depth - 2 * section.wall - 2 * c)
      return (Math.PI / 4) * (outer ** 2 - inner ** 2)
    }
  }
}

/** Resistance of a base plate in concentric compression, N. */
export function plateResistance(
  section: Section,
  t: number,
  fy: number,
  fck: number,
  plate: PlateSize,
): number {
  const fjd = jointStrength(fck)
  return fjd * bearingArea(section, bearingWidth(t, fy, fjd), plate)
}

/** The plate under compression by EN 1993-1-8 6.2.5 with its steps. */
export function enPlateChecks(
  { section, required, concrete }: BaseInput,
  { plate }: BaseParts,
): { checks: Check[]; values: Record<string, number> } {
  const fjd = jointStrength(concrete.strength)
  const c = bearingWidth(plate.thickness, plate.yield, fjd)
  const area = bearingArea(section, c, plate)
  const resistance = fjd * area
  const mpa = (value: number): Quantity => ({ value, unit: 'MPa' })
  const mm: Quantity = { value: plate.thickness, unit: 'mm' }
  const check: Check = {
    clause: '6.2.5',
    title: 'Base plate on concrete in compression',
    ...{ demand: required.compression, capacity: resistance, unit: 'N' },
    utilisation: required.compression / resistance,
    steps: [
      makeStep({
        symbol: 'fjd',
        expression: 'βj·α·αcc·fck / γC, α = 1',
        template: `2/3 · ${ALPHA} · ${ALPHA_CC} · {0} / ${GAMMA_C}`,
        terms: [mpa(concrete.strength)],
        value: fjd,
        unit: 'MPa',
      }),
      makeStep({
        symbol: 'c',
        expression: 't·√(fy / (3·fjd·γM0))',
        template: '{0} · √({1} / (3 · {2}))',
        terms: [mm, mpa(plate.yield), mpa(fjd)],
        value: c,
        unit: 'mm',
      }),
      makeStep({
        symbol: 'Aeff',
        expression: 'outline grown by c, within the plate',
        template: '{0}',
        terms: [{ value: area, unit: 'mm²' }],
        value: area,
        unit: 'mm²',
      }),
      makeStep({
        symbol: 'NRd',
        expression: 'fjd·Aeff',
        template: '{0} · {1}',
        terms: [mpa(fjd), { value: area, unit: 'mm²' }],
        value: resistance,
        unit: 'N',
      }),
    ],
    notes: ['γM0 = 1.0; no spread of the load in the concrete is counted on.'],
  }
  const values = {
    fjd,
    bearingWidth: c,
    bearingArea: area,
    bearingAvailable: resistance,
    bearingRatio: check.utilisation,
  }
  return { checks: [check], values }
}
