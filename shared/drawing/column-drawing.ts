import type { Axis, Brace, Column, EffectiveLength } from '../stability/column.ts'
import type { UnitSystem } from '../units/step.ts'

/** What there is to draw of a column; the less is known, the less is drawn. */
export interface ColumnDrawing {
  /** mm. */
  height: number
  ends: Column['ends']
  braces: readonly Brace[]
  lengths?: Record<Axis, EffectiveLength> | undefined
  /** Of the section, mm; left out while there is no section yet. */
  depth?: number | undefined
  width?: number | undefined
  /** Governing compression and uplift, N, positive. */
  compression?: number | undefined
  uplift?: number | undefined
  system: UnitSystem
  /** Room to draw in; the drawing keeps this width and may come out lower. */
  sheet?: { width: number; height: number } | undefined
}

export function holdsAxis(brace: Brace, axis: Axis): boolean {
  return brace.holds === 'both' || brace.holds === axis
}
