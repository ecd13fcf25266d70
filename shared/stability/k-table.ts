import type { EndCondition, EndFixity } from './column.ts'

export interface KRow {
  ends: readonly [EndCondition, EndCondition]
  theoretical: number
  recommended: number
}

/** Effective length factors of a column between two ends: ANSI/AISC 360-22 Commentary, Table C-A-7.1. */
export const K_TABLE: readonly KRow[] = [
  { ends: ['fixed', 'fixed'], theoretical: 0.5, recommended: 0.65 },
  { ends: ['fixed', 'pinned'], theoretical: 0.7, recommended: 0.8 },
  { ends: ['pinned', 'pinned'], theoretical: 1, recommended: 1 },
  { ends: ['fixed', 'guided'], theoretical: 1, recommended: 1.2 },
  { ends: ['fixed', 'free'], theoretical: 2, recommended: 2.1 },
  { ends: ['pinned', 'guided'], theoretical: 2, recommended: 2 },
]

/**
 * K of a part between two ends, in either order; a brace counts as `pinned`.
 * `null` for pairs that the table does not have: such a part is a mechanism by itself.
 */
export function kFactor(one: EndCondition, other: EndCondition, fixity: EndFixity): number | null {
  const row = K_TABLE.find(({ ends: [a, b] }) => (a === one && b === other) || (a === other && b === one))
  return row ? row[fixity] : null
}
