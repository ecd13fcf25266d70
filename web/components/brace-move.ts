import { MM_PER_INCH } from '../../shared/units/convert.ts'
import type { Brace } from '../../shared/stability/column.ts'
import type { UnitSystem } from '../../shared/units/step.ts'

/** Braces closer than this to an end or to each other are refused. */
export const CLEARANCE = 50

/** How low and how high a brace may go between its neighbours, mm. */
export function braceRange(braces: readonly Brace[], index: number, columnHeight: number): [number, number] {
  const own = braces[index]?.height ?? 0
  const others = braces.filter((_, other) => other !== index).map((brace) => brace.height)
  const below = Math.max(0, ...others.filter((height) => height <= own))
  const above = Math.min(columnHeight, ...others.filter((height) => height > own))
  return [below + CLEARANCE, above - CLEARANCE]
}

/** The steps that a hand takes: 50 mm or an inch, and half a metre or a foot. */
export function braceSteps(system: UnitSystem): { small: number; large: number } {
  return system === 'US' ? { small: MM_PER_INCH, large: MM_PER_INCH * 12 } : { small: 50, large: 500 }
}

/** The nearest whole step inside the range. */
export function settle(height: number, [least, most]: [number, number], system: UnitSystem): number {
  const { small } = braceSteps(system)
  const whole = Math.round(height / small) * small
  return Number(Math.min(Math.max(whole, least), most).toFixed(3))
}

/** Where a key takes the brace, or nothing when the key is not one of ours. */
export function heightByKey(
  key: string,
  height: number,
  [least, most]: [number, number],
  system: UnitSystem,
): number | undefined {
  const { small, large } = braceSteps(system)
  const moves: Record<string, number> = {
    ArrowUp: height + small,
    ArrowRight: height + small,
    ArrowDown: height - small,
    ArrowLeft: height - small,
    PageUp: height + large,
    PageDown: height - large,
    Home: least,
    End: most,
  }
  const wanted = moves[key]
  return wanted === undefined ? undefined : Number(Math.min(Math.max(wanted, least), most).toFixed(3))
}
