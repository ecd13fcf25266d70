import { KG_M_PER_LB_FT, KG_PER_LB, MM_PER_INCH, MPA_PER_KSI, N_PER_KIP } from './convert.ts'
import type { Unit, UnitSystem } from './step.ts'

export interface DisplayUnit {
  /** How many of the engine's units it holds. */
  factor: number
  symbol: string
}

const US: Record<Unit, DisplayUnit> = {
  mm: { factor: MM_PER_INCH, symbol: 'in' },
  'mm²': { factor: MM_PER_INCH ** 2, symbol: 'in²' },
  'mm³': { factor: MM_PER_INCH ** 3, symbol: 'in³' },
  'mm⁴': { factor: MM_PER_INCH ** 4, symbol: 'in⁴' },
  'mm⁶': { factor: MM_PER_INCH ** 6, symbol: 'in⁶' },
  N: { factor: N_PER_KIP, symbol: 'kip' },
  'N·mm': { factor: N_PER_KIP * MM_PER_INCH, symbol: 'kip·in' },
  'N/mm': { factor: N_PER_KIP / MM_PER_INCH, symbol: 'kip/in' },
  MPa: { factor: MPA_PER_KSI, symbol: 'ksi' },
  kg: { factor: KG_PER_LB, symbol: 'lb' },
  'kg/m': { factor: KG_M_PER_LB_FT, symbol: 'lb/ft' },
  '1': { factor: 1, symbol: '' },
}

/** Results are read in larger units than they are computed in. */
const LARGER: Record<UnitSystem, Partial<Record<Unit, DisplayUnit>>> = {
  SI: { N: { factor: 1e3, symbol: 'kN' }, 'N·mm': { factor: 1e6, symbol: 'kN·m' } },
  US: { 'N·mm': { factor: N_PER_KIP * MM_PER_INCH * 12, symbol: 'kip·ft' } },
}

/** The unit of a term inside an expression: one consistent set, so that a reader can redo the sum as it stands. */
export function termUnit(unit: Unit, system: UnitSystem): DisplayUnit {
  return system === 'US' ? US[unit] : { factor: 1, symbol: unit === '1' ? '' : unit }
}

/** The unit in which a result is read: kN, kN·m; kip, kip·ft. */
export function resultUnit(unit: Unit, system: UnitSystem): DisplayUnit {
  return LARGER[system][unit] ?? termUnit(unit, system)
}
