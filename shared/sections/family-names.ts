import type { Family } from './section.ts'

/** Families as the trade calls them. */
export const FAMILY_NAMES: Record<Family, string> = {
  W: 'W shapes',
  HSS_SQUARE: 'Square HSS',
  HSS_RECT: 'Rectangular HSS',
  HSS_ROUND: 'Round HSS',
  PIPE: 'Pipe',
  HEA: 'HEA',
  HEB: 'HEB',
  HEM: 'HEM',
  IPE: 'IPE',
  UC: 'UC',
  UB: 'UB',
  SHS: 'SHS',
  RHS: 'RHS',
  CHS: 'CHS',
}
