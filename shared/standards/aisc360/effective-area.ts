import type { RoundSection, Section } from '../../sections/section.ts'
import { refuse } from '../../units/refusal.ts'
import { effectiveWidth, fullWidthLimit } from './effective-width.ts'
import {
  flatElements,
  hssWallLimit,
  rolledFlangeLimit,
  roundLimit,
  webLimit,
  type Element,
} from './local-slenderness.ts'

/** (D/t)·(Fy/E) from which E7.2 gives no rule. */
export const ROUND_RANGE = 0.45

/** D/t that E7.2 still covers: 0.45·E/Fy. */
export function roundRange(E: number, Fy: number): number {
  return (ROUND_RANGE * E) / Fy
}

/**
 * Effective area of a round HSS or pipe: Ag for D/t ≤ 0.11·E/Fy, then Ae = [0.038·E/(Fy·D/t) + 2/3]·Ag, at most Ag. mm².
 * Refuses D/t ≥ 0.45·E/Fy. ANSI/AISC 360-22 Eq. E7-6, E7-7 (360-16 alike).
 */
export function roundEffectiveArea(
  section: Pick<RoundSection, 'area' | 'diameterRatio'>,
  E: number,
  Fy: number,
): number {
  const { area, diameterRatio } = section
  if (diameterRatio <= roundLimit(E, Fy)) return area
  if (diameterRatio >= roundRange(E, Fy)) {
    refuse(
      'section',
      `its D/t of ${diameterRatio} is not below 0.45·E/Fy = ${roundRange(E, Fy).toFixed(1)}; ` +
        'AISC 360 E7.2 gives no strength there: choose a thicker wall',
    )
  }
  return Math.min(area, ((0.038 * E) / (Fy * diameterRatio) + 2 / 3) * area)
}

/**
 * Effective area: Ag − Σ(b − be)·t over the elements, mm², at the nominal stress Fn of E3 or E4, MPa.
 * ANSI/AISC 360-22 E7.1 (360-16 alike).
 */
export function flatEffectiveArea(
  area: number,
  elements: readonly Element[],
  Fy: number,
  Fn: number,
): number {
  return elements.reduce(
    (rest, element) =>
      rest - element.count * (element.width - effectiveWidth(element, Fy, Fn)) * element.thickness,
    area,
  )
}

/** Whether every flat element is fully effective under Fn: the common case, told without making a list of elements. */
function isFull(section: Exclude<Section, RoundSection>, E: number, Fy: number, Fn: number): boolean {
  if (section.shape === 'box') {
    const full = fullWidthLimit(hssWallLimit(E, Fy), Fy, Fn)
    return section.widthRatio <= full && section.depthRatio <= full
  }
  if (section.builtUp) return false
  return (
    section.flangeRatio <= fullWidthLimit(rolledFlangeLimit(E, Fy), Fy, Fn) &&
    section.webRatio <= fullWidthLimit(webLimit(E, Fy), Fy, Fn)
  )
}

/** Effective area of any shape under the nominal stress Fn, mm². E7. */
export function effectiveArea(section: Section, E: number, Fy: number, Fn: number): number {
  if (section.shape === 'round') return roundEffectiveArea(section, E, Fy)
  if (isFull(section, E, Fy, Fn)) return section.area
  return flatEffectiveArea(section.area, flatElements(section, E, Fy), Fy, Fn)
}
