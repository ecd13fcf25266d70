import { KG_M_PER_LB_FT, KG_PER_LB, MM_PER_INCH, MPA_PER_KSI, N_PER_KIP } from '../../shared/units/convert.ts'
import type { Step, Unit, UnitSystem } from '../../shared/units/step.ts'

interface Shown {
  factor: number
  unit: string
}

/** The unit in which a document states a quantity, and how many of the engine's units it holds. */
const US: Record<Unit, Shown> = {
  mm: { factor: MM_PER_INCH, unit: 'in' },
  'mm²': { factor: MM_PER_INCH ** 2, unit: 'in²' },
  'mm³': { factor: MM_PER_INCH ** 3, unit: 'in³' },
  'mm⁴': { factor: MM_PER_INCH ** 4, unit: 'in⁴' },
  'mm⁶': { factor: MM_PER_INCH ** 6, unit: 'in⁶' },
  N: { factor: N_PER_KIP, unit: 'kip' },
  'N·mm': { factor: N_PER_KIP * MM_PER_INCH, unit: 'kip·in' },
  'N/mm': { factor: N_PER_KIP / MM_PER_INCH, unit: 'kip/in' },
  MPa: { factor: MPA_PER_KSI, unit: 'ksi' },
  kg: { factor: KG_PER_LB, unit: 'lb' },
  'kg/m': { factor: KG_M_PER_LB_FT, unit: 'lb/ft' },
  '1': { factor: 1, unit: '' },
}
const SI: Partial<Record<Unit, Shown>> = {
  N: { factor: 1e3, unit: 'kN' },
  'N·mm': { factor: 1e6, unit: 'kN·m' },
  'N/mm': { factor: 1, unit: 'kN/m' },
}

/** Four figures carry what an engineer checks; more would only look exact. */
const FIGURES = 4

export function figure(value: number): string {
  if (value === 0) return '0'
  const size = Math.abs(value)
  if (size >= 1e7 || size < 1e-3) return scientific(value)
  if (size >= 1000) return Math.round(value).toLocaleString('en-US').replaceAll(',', ' ')
  return String(Number(value.toPrecision(FIGURES)))
}

const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹'

function scientific(value: number): string {
  const [mantissa = '0', exponent = '0'] = value.toExponential(FIGURES - 1).split('e')
  const raised = [...exponent.replace('+', '')]
    .map((digit) => (digit === '-' ? '⁻' : RAISED[Number(digit)]))
    .join('')
  return `${Number(mantissa)}·10${raised}`
}

/** A quantity in the reader's units: "1 250 kN". */
export function quantity(value: number, unit: Unit, system: UnitSystem): string {
  const shown = (system === 'US' ? US[unit] : SI[unit]) ?? { factor: 1, unit: unit === '1' ? '' : unit }
  const text = figure(value / shown.factor)
  return shown.unit ? `${text} ${shown.unit}` : text
}

/** The numbers of a step put into its expression, in the units that the reader is shown nowhere else converted. */
export function substituted(step: Step, system: UnitSystem): string {
  if (system === 'SI') return step.substitution
  return step.template.replace(/\{(\d+)\}/g, (place, index: string) => {
    const term = step.terms[Number(index)]
    return term ? quantity(term.value, term.unit, system) : place
  })
}

export function percent(fraction: number): string {
  return `${(fraction * 100).toFixed(0)} %`
}

/** Keeps a number, its fraction and its unit on one line. */
export function bound(text: string): string {
  return text.replace(/(\d|Ø) (?=\d|mm|m\b|k|M|ft|in|lb|%)/g, '$1\u00a0')
}
