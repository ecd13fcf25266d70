import { resultUnit } from '../../shared/units/display.ts'
import { figures } from '../../shared/units/figures.ts'
import type { Unit, UnitSystem } from '../../shared/units/step.ts'

/** A quantity as figures and unit apart, since the page sets units smaller. */
export function quantityParts(
  value: number,
  unit: Unit,
  system: UnitSystem,
): { figures: string; unit: string } {
  const { factor, symbol } = resultUnit(unit, system)
  return { figures: figures(value / factor), unit: symbol }
}

/** A share as a percentage: "71 %"; in full where rounding would hide which side of the limit it is. */
export function percentText(fraction: number): string {
  const whole = Math.round(fraction * 100)
  const hidden = whole === 100 && fraction !== 1
  return `${hidden ? (fraction * 100).toFixed(1) : whole}\u00a0%`
}

/** A mass as it is lifted: kg or lb, whole. */
export function massText(kg: number, system: UnitSystem): string {
  const { figures: text, unit } = quantityParts(Math.round(kg), 'kg', system)
  return `${text}\u00a0${unit}`
}
