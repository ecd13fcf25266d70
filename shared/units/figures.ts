/** Four figures carry what an engineer checks; more would only look exact. */
const FIGURES = 4
/** Groups of a number and number and unit stay on one line. */
export const NO_BREAK_SPACE = '\u00a0'
const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹'

/** A number as read: four figures, thousands in groups, powers of ten beyond ten million and below a thousandth. */
export function figures(value: number): string {
  if (value === 0) return '0'
  const size = Math.abs(value)
  if (!Number.isFinite(size)) return size === Infinity ? (value < 0 ? '−∞' : '∞') : '–'
  const sign = value < 0 ? '−' : ''
  if (size >= 1e7 || size < 1e-3) return sign + scientific(size)
  const rounded = Number(size.toPrecision(FIGURES))
  return sign + (rounded >= 1000 ? grouped(Math.round(size)) : String(rounded))
}

function grouped(whole: number): string {
  return String(whole).replaceAll(/\B(?=(\d{3})+$)/g, NO_BREAK_SPACE)
}

function scientific(size: number): string {
  const [mantissa = '0', exponent = '0'] = size.toExponential(FIGURES - 1).split('e')
  const raised = [...exponent.replace('+', '')]
    .map((sign) => (sign === '-' ? '⁻' : RAISED[Number(sign)]))
    .join('')
  return `${Number(mantissa)}·10${raised}`
}
