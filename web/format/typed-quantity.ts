import { detailLabel, heightLabel } from '../../shared/drawing/labels.ts'
import { MPA_PER_KSI, N_PER_KIP } from '../../shared/units/convert.ts'
import { parseForce } from '../../shared/units/parse-force.ts'
import { parseLength } from '../../shared/units/parse-length.ts'
import { parseUnsigned, splitSign, type Parsed } from '../../shared/units/parse-number.ts'
import type { UnitSystem } from '../../shared/units/step.ts'

/** What a field holds; each is stored in the engine's unit and typed in the person's. */
export type QuantityKind = 'height' | 'detail' | 'force' | 'stress' | 'distance' | 'number'

interface Manner {
  /** Shown behind the field. */
  symbol: Record<UnitSystem, string>
  read: (text: string, system: UnitSystem) => Parsed
  write: (value: number, system: UnitSystem) => string
}

const KM_PER_MILE = 1.609344

function trimmed(value: number, places: number): string {
  return String(Number(value.toFixed(places)))
}

/** A plain number with an optional unit, each unit by its factor to the engine's. */
function plain(factors: Record<string, number>, bare: Record<UnitSystem, string>): Manner['read'] {
  return (text, system) => {
    const { sign, rest } = splitSign(text)
    const found = /^(?<amount>[\d.,\s]*[\d.,])\s*(?<unit>[a-z]*)$/i.exec(rest)?.groups
    const factor = factors[(found?.unit || bare[system]).toLowerCase()]
    if (!found || factor === undefined) {
      return { ok: false, message: `write a number, such as 28${bare[system] ? ` ${bare[system]}` : ''}` }
    }
    const parsed = parseUnsigned(found.amount ?? '')
    return parsed.ok ? { ok: true, value: sign * parsed.value * factor } : parsed
  }
}

const MANNERS: Record<QuantityKind, Manner> = {
  height: {
    // Feet and inches carry their own marks.
    symbol: { SI: 'mm', US: '' },
    read: (text, system) => parseLength(text, system, system === 'US' ? 'ft' : 'mm'),
    write: (value, system) => (system === 'US' ? heightLabel(value, system) : trimmed(value, 1)),
  },
  detail: {
    symbol: { SI: 'mm', US: 'in' },
    read: (text, system) => parseLength(text, system),
    write: (value, system) =>
      system === 'US' ? detailLabel(value, system).replace('″', '') : trimmed(value, 1),
  },
  force: {
    symbol: { SI: 'kN', US: 'kip' },
    read: parseForce,
    write: (value, system) => trimmed(value / (system === 'US' ? N_PER_KIP : 1000), 3),
  },
  stress: {
    symbol: { SI: 'MPa', US: 'ksi' },
    read: plain({ mpa: 1, ksi: MPA_PER_KSI, psi: MPA_PER_KSI / 1000 }, { SI: 'MPa', US: 'ksi' }),
    write: (value, system) => trimmed(system === 'US' ? value / MPA_PER_KSI : value, 2),
  },
  distance: {
    symbol: { SI: 'km', US: 'mi' },
    read: plain({ km: 1, mi: KM_PER_MILE, miles: KM_PER_MILE }, { SI: 'km', US: 'mi' }),
    write: (value, system) => trimmed(system === 'US' ? value / KM_PER_MILE : value, 1),
  },
  number: {
    symbol: { SI: '', US: '' },
    read: plain({ '': 1 }, { SI: '', US: '' }),
    write: (value) => trimmed(value, 6),
  },
}

export function quantitySymbol(kind: QuantityKind, system: UnitSystem): string {
  return MANNERS[kind].symbol[system]
}

export function readQuantity(text: string, kind: QuantityKind, system: UnitSystem): Parsed {
  return MANNERS[kind].read(text, system)
}

export function writeQuantity(value: number, kind: QuantityKind, system: UnitSystem): string {
  return MANNERS[kind].write(value, system)
}
