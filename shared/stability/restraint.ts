import type { EndCondition, Ends } from './column.ts'

const HOLDS_TRANSLATION: Record<EndCondition, boolean> = {
  pinned: true,
  fixed: true,
  guided: false,
  free: false,
}
const HOLDS_ROTATION: Record<EndCondition, boolean> = {
  pinned: false,
  fixed: true,
  guided: true,
  free: false,
}

export function holdsTranslation(end: EndCondition): boolean {
  return HOLDS_TRANSLATION[end]
}

export function holdsRotation(end: EndCondition): boolean {
  return HOLDS_ROTATION[end]
}

/**
 * Whether the column can move without bending about one axis: a straight bar has two such motions, sideways and turning.
 * Two points held sideways stop both; one point held sideways stops both if some end cannot turn.
 */
export function isMechanism(height: number, ends: Ends, braceHeights: readonly number[]): boolean {
  const heldAt = new Set(braceHeights)
  if (holdsTranslation(ends.bottom)) heldAt.add(0)
  if (holdsTranslation(ends.top)) heldAt.add(height)
  if (heldAt.size >= 2) return false
  const turningHeld = holdsRotation(ends.bottom) || holdsRotation(ends.top)
  return heldAt.size === 0 || !turningHeld
}
