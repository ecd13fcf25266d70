import { MM_PER_INCH, mm, type Millimetres } from './convert.ts'
import { not, parseUnsigned, splitSign, type Parsed } from './parse-number.ts'
import type { UnitSystem } from './step.ts'

const METRIC: Record<string, number> = { mm: 1, cm: 10, m: 1000 }
const EXAMPLES: Record<UnitSystem, string> = {
  SI: 'a length is written like 4200, 4200 mm or 4.2 m',
  US: 'a length is written like 12\'-6 1/2", 12.5 ft or 150.5 in',
}
const FEET = /^(?<feet>[\d.,]+)\s*(?:'|′|’|ft\.?|feet|foot)\s*-?\s*(?<rest>.*)$/i
const INCHES =
  /^(?:(?<whole>[\d.,]+)(?:[\s-]+(?=\d+\s*\/)|(?=\s*(?:["″”]|in|$))))?(?:(?<over>\d+)\s*\/\s*(?<under>\d+))?\s*(?<mark>["″”]|''|in\.?|inch(?:es)?)?$/i

/**
 * A length as typed, in mm. Takes mm, cm, m, feet and inches with fractions in either system; a bare number is in mm (SI) or
 * in inches (US), unless `bare` says otherwise.
 */
export function parseLength(
  text: string,
  system: UnitSystem,
  bare: 'mm' | 'm' | 'in' | 'ft' = system === 'US' ? 'in' : 'mm',
): Parsed<Millimetres> {
  const { sign, rest } = splitSign(text)
  if (rest === '') return not(EXAMPLES[system])
  const parsed = metric(rest) ?? bareNumber(rest, bare) ?? feetAndInches(rest)
  if (!parsed) return not(EXAMPLES[system])
  return parsed.ok ? { ok: true, value: mm(sign * parsed.value) } : parsed
}

function metric(text: string): Parsed | undefined {
  const found = /^(?<amount>.*?\d[.,]?)\s*(?<unit>mm|cm|m)$/i.exec(text)?.groups
  return found && scaled(found.amount ?? '', METRIC[(found.unit ?? '').toLowerCase()] ?? 1)
}

function bareNumber(text: string, bare: 'mm' | 'm' | 'in' | 'ft'): Parsed | undefined {
  if (!/^[\d.,\s\u00a0\u202f]+$/.test(text)) return undefined
  const factor = { mm: 1, m: 1000, in: MM_PER_INCH, ft: 12 * MM_PER_INCH }[bare]
  return scaled(text, factor)
}

function scaled(text: string, factor: number): Parsed {
  const parsed = parseUnsigned(text)
  return parsed.ok ? { ok: true, value: parsed.value * factor } : parsed
}

function feetAndInches(text: string): Parsed | undefined {
  const withFeet = FEET.exec(text)?.groups
  const feet = withFeet ? parseUnsigned(withFeet.feet ?? '') : { ok: true as const, value: 0 }
  if (!feet.ok) return feet
  const rest = withFeet ? (withFeet.rest ?? '') : text
  const inches = withFeet && rest === '' ? { ok: true as const, value: 0 } : inchesOf(rest)
  if (!inches?.ok) return inches
  if (withFeet && inches.value >= 12) return not('inches beside feet are less than 12')
  return { ok: true, value: (feet.value * 12 + inches.value) * MM_PER_INCH }
}

function inchesOf(text: string): Parsed | undefined {
  const found = INCHES.exec(text)?.groups
  if (!found || (found.whole === undefined && found.over === undefined)) return undefined
  const whole = found.whole === undefined ? { ok: true as const, value: 0 } : parseUnsigned(found.whole)
  if (!whole.ok || found.over === undefined) return whole
  const under = Number(found.under)
  // 61/2" is far more likely six and a half, typed without its space, than thirty and a half.
  if (Number(found.over) >= under) return not('a fraction of an inch is less than one: 6 1/2", not 61/2"')
  return { ok: true, value: whole.value + Number(found.over) / under }
}
