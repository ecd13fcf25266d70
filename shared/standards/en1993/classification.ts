import type { Section } from '../../sections/section.ts'

/** A part of a section in uniform compression, EN 1993-1-1 Table 5.2. */
export interface Part {
  name: 'flange' | 'web' | 'wall across the width' | 'wall across the depth'
  kind: 'outstand' | 'internal'
  /** Flat width and thickness, mm. */
  c: number
  t: number
  count: number
}

/** ε = √(235/fy). */
export function epsilonOf(fy: number): number {
  return Math.sqrt(235 / fy)
}

/** Limits of c/t for classes 1, 2 and 3, as multiples of ε. */
const LIMITS = { outstand: [9, 10, 14], internal: [33, 38, 42] } as const
/** Limits of D/t, as multiples of ε². */
const ROUND_LIMITS = [50, 70, 90] as const

/** Flat parts; a round section has none. Webs of I net of the root radius; hollow c = b − 3t. */
export function partsOf(section: Section): Part[] {
  switch (section.shape) {
    case 'I': {
      const { width, depth, tw, tf, fillet } = section
      return [
        { name: 'flange', kind: 'outstand', c: (width - tw - 2 * fillet) / 2, t: tf, count: 4 },
        { name: 'web', kind: 'internal', c: depth - 2 * tf - 2 * fillet, t: tw, count: 1 },
      ]
    }
    case 'box': {
      const { wall, widthRatio, depthRatio } = section
      return [
        { name: 'wall across the width', kind: 'internal', c: widthRatio * wall, t: wall, count: 2 },
        { name: 'wall across the depth', kind: 'internal', c: depthRatio * wall, t: wall, count: 2 },
      ]
    }
    case 'round':
      return []
  }
}

function classAt(ratio: number, limits: readonly number[], factor: number): number {
  const index = limits.findIndex((limit) => ratio <= limit * factor)
  return index === -1 ? 4 : index + 1
}

export function partClass({ kind, c, t }: Part, fy: number): number {
  return classAt(c / t, LIMITS[kind], epsilonOf(fy))
}

/** Limit of class 3, c/t. */
export function classThreeLimit(kind: Part['kind'], fy: number): number {
  return LIMITS[kind][2] * epsilonOf(fy)
}

export function roundClass(diameterRatio: number, fy: number): number {
  return classAt(diameterRatio, ROUND_LIMITS, epsilonOf(fy) ** 2)
}

/** Class of a section in uniform compression: its worst part's. EN 1993-1-1 5.5.2. */
export function classOf(section: Section, fy: number): number {
  if (section.shape === 'round') return roundClass(section.diameterRatio, fy)
  return Math.max(...partsOf(section).map((part) => partClass(part, fy)))
}
