import { resultUnit, termUnit, type DisplayUnit } from './display.ts'
import { figures, NO_BREAK_SPACE } from './figures.ts'
import type { Quantity, Step, Unit, UnitSystem } from './step.ts'

function inUnit(value: number, { factor, symbol }: DisplayUnit): string {
  const text = figures(value / factor)
  return symbol ? `${text}${NO_BREAK_SPACE}${symbol}` : text
}

/** A result in the units in which it is read: "2 114 kN", "475.2 kip". */
export function formatQuantity(value: number, unit: Unit, system: UnitSystem): string {
  return inUnit(value, resultUnit(unit, system))
}

/** A term in the consistent set in which expressions are written: N, mm, MPa or kip, in, ksi. */
export function formatTerm({ value, unit }: Quantity, system: UnitSystem): string {
  return inUnit(value, termUnit(unit, system))
}

/** An expression with its numbered places filled: `π² · {0} / ({1} / {2})²`. A place without a term stays as it is. */
export function fillTemplate(template: string, terms: readonly Quantity[], system: UnitSystem): string {
  return template.replaceAll(/\{(\d+)\}/g, (place, index: string) => {
    const term = terms[Number(index)]
    return term ? formatTerm(term, system) : place
  })
}

/** A step's numbers put into its expression, in the reader's units. */
export function render(step: Pick<Step, 'template' | 'terms'>, system: UnitSystem): string {
  return fillTemplate(step.template, step.terms, system)
}

/** A step with its substitution filled in SI. */
export function makeStep(step: Omit<Step, 'substitution'>): Step {
  return { ...step, substitution: render(step, 'SI') }
}
