import { N_PER_KIP, newtons, type Newtons } from './convert.ts'
import { not, parseUnsigned, splitSign, type Parsed } from './parse-number.ts'
import type { UnitSystem } from './step.ts'

const IN_NEWTONS: Record<string, number> = {
  n: 1,
  kn: 1e3,
  mn: 1e6,
  kip: N_PER_KIP,
  kips: N_PER_KIP,
  k: N_PER_KIP,
  lb: N_PER_KIP / 1000,
  lbs: N_PER_KIP / 1000,
  lbf: N_PER_KIP / 1000,
}
const EXAMPLES: Record<UnitSystem, string> = {
  SI: 'a force is written like 1250, 1250 kN or 1.25 MN',
  US: 'a force is written like 280, 280 kip or 280 000 lb',
}

/** A force as typed, in N. Takes N, kN, MN, kip and lb in either system; a bare number is in kN (SI) or kip (US). */
export function parseForce(text: string, system: UnitSystem): Parsed<Newtons> {
  const { sign, rest } = splitSign(text)
  const found = /^(?<amount>[\d.,\s\u00a0\u202f]*[\d.,])\s*(?<unit>[a-z]*)$/i.exec(rest)?.groups
  const unit = (found?.unit || (system === 'US' ? 'kip' : 'kN')).toLowerCase()
  const factor = IN_NEWTONS[unit]
  if (!found || factor === undefined) return not(EXAMPLES[system])
  const parsed = parseUnsigned(found.amount ?? '')
  return parsed.ok ? { ok: true, value: newtons(sign * parsed.value * factor) } : parsed
}
