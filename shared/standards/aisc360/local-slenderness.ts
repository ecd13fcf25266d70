import type { ISection, RoundSection, Section } from '../../sections/section.ts'
import { C1_C2 } from './effective-width.ts'

/** √(E/Fy), the measure of every limit for flat elements in Table B4.1a. */
function measure(E: number, Fy: number): number {
  return Math.sqrt(E / Fy)
}

/** Flange of a rolled I, b/t: λr = 0.56·√(E/Fy). Table B4.1a case 1. E, Fy MPa. */
export function rolledFlangeLimit(E: number, Fy: number): number {
  return 0.56 * measure(E, Fy)
}

/** kc = 4/√(h/tw), from 0.35 to 0.76. Table B4.1a note a. */
export function webStiffening(webRatio: number): number {
  return Math.min(0.76, Math.max(0.35, 4 / Math.sqrt(webRatio)))
}

/** Flange of a built-up I, b/t: λr = 0.64·√(kc·E/Fy). Table B4.1a case 2. */
export function builtUpFlangeLimit(E: number, Fy: number, kc: number): number {
  return 0.64 * Math.sqrt(kc) * measure(E, Fy)
}

/** Web of a doubly symmetric I, h/tw: λr = 1.49·√(E/Fy). Table B4.1a case 5. */
export function webLimit(E: number, Fy: number): number {
  return 1.49 * measure(E, Fy)
}

/** Wall of a rectangular HSS, b/t: λr = 1.40·√(E/Fy). Table B4.1a case 6. */
export function hssWallLimit(E: number, Fy: number): number {
  return 1.4 * measure(E, Fy)
}

/** Wall of a round HSS or pipe, D/t: λr = 0.11·E/Fy. Table B4.1a case 9. */
export function roundLimit(E: number, Fy: number): number {
  return (0.11 * E) / Fy
}

/** A flat part of a section in uniform compression. */
export interface Element {
  name: 'flange' | 'web' | 'wall across the width' | 'wall across the depth'
  /** Symbol of its ratio in the Manual. */
  symbol: 'bf/2tf' | 'h/tw' | 'b/t' | 'h/t'
  /** Width-to-thickness ratio. */
  ratio: number
  /** λr. */
  limit: number
  /** λr as written: coefficient and kc. */
  coefficient: number
  kc: number | null
  /** Width and thickness, mm: width = ratio × thickness, so that the published ratio counts. */
  width: number
  thickness: number
  /** How many of them the section has. */
  count: number
  /** Imperfection factors of E7. */
  c1: number
  c2: number
}

function elementsOfI(section: ISection, E: number, Fy: number): Element[] {
  const { flangeRatio, webRatio, tf, tw } = section
  const kc = section.builtUp ? webStiffening(webRatio) : null
  return [
    {
      name: 'flange',
      symbol: 'bf/2tf',
      ratio: flangeRatio,
      limit: kc === null ? rolledFlangeLimit(E, Fy) : builtUpFlangeLimit(E, Fy, kc),
      coefficient: kc === null ? 0.56 : 0.64,
      kc,
      width: flangeRatio * tf,
      thickness: tf,
      count: 4,
      ...C1_C2.flange,
    },
    {
      name: 'web',
      symbol: 'h/tw',
      ratio: webRatio,
      limit: webLimit(E, Fy),
      coefficient: 1.49,
      kc: null,
      width: webRatio * tw,
      thickness: tw,
      count: 1,
      ...C1_C2.web,
    },
  ]
}

/** Flat elements of a section in uniform compression, with their limits; a round one has none. */
export function flatElements(section: Exclude<Section, RoundSection>, E: number, Fy: number): Element[] {
  if (section.shape === 'I') return elementsOfI(section, E, Fy)
  const limit = hssWallLimit(E, Fy)
  const { widthRatio, depthRatio, designWall } = section
  return [
    wallElement('wall across the width', 'b/t', widthRatio, designWall, limit),
    wallElement('wall across the depth', 'h/t', depthRatio, designWall, limit),
  ]
}

function wallElement(
  name: Element['name'],
  symbol: Element['symbol'],
  ratio: number,
  thickness: number,
  limit: number,
): Element {
  const { c1, c2 } = C1_C2.hssWall
  const width = ratio * thickness
  return { name, symbol, ratio, limit, coefficient: 1.4, kc: null, width, thickness, count: 2, c1, c2 }
}
