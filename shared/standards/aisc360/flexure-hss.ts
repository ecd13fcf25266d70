import type { BoxSection, RoundSection } from '../../sections/section.ts'
import { refuse } from '../../units/refusal.ts'
import { roundRange } from './effective-area.ts'

export type Axis = 'strong' | 'weak'

/** Strength of one limit state after another, N·mm; lengths mm. */
export interface FlexureBox {
  Mp: number
  Lp: number
  Lr: number
  lateral: number
  flange: number
  web: number
  nominal: number
}

/** Limits of a rectangular HSS in flexure, Table B4.1b cases 17 and 19: flange 1.12q, 1.40q; web 2.42q, 5.70q. */
export function boxLimits(E: number, Fy: number) {
  const q = Math.sqrt(E / Fy)
  return { flangeCompact: 1.12 * q, flangeSlender: 1.4 * q, webCompact: 2.42 * q, webSlender: 5.7 * q }
}

/** Effective width of a slender flange: be = 1.92·t·q·(1 − 0.38·q/(b/t)) ≤ b, q = √(E/Fy). mm. Eq. F7-4. */
export function effectiveFlange(width: number, thickness: number, E: number, Fy: number): number {
  const q = Math.sqrt(E / Fy)
  return Math.min(width, 1.92 * thickness * q * (1 - (0.38 * q) / (width / thickness)))
}

interface Turned {
  S: number
  Z: number
  I: number
  depth: number
  flangeRatio: number
  webRatio: number
}

/** The section as bent about one axis: its flanges lie across the bending. */
function turned(section: BoxSection, axis: Axis): Turned {
  const { Sx, Zx, Ix, Sy, Zy, Iy, depth, width, widthRatio, depthRatio } = section
  return axis === 'strong'
    ? { S: Sx, Z: Zx, I: Ix, depth, flangeRatio: widthRatio, webRatio: depthRatio }
    : { S: Sy, Z: Zy, I: Iy, depth: width, flangeRatio: depthRatio, webRatio: widthRatio }
}

/** Section modulus when only be of the compression flange counts: its neutral axis moves to the other side. mm³. */
function effectiveModulus(
  section: BoxSection,
  { I, depth, flangeRatio }: Turned,
  E: number,
  Fy: number,
): number {
  const t = section.designWall
  const lost = flangeRatio * t - effectiveFlange(flangeRatio * t, t, E, Fy)
  const arm = (depth - t) / 2
  const area = section.area - lost * t
  const shift = (lost * t * arm) / area
  const inertia = I - (lost * t ** 3) / 12 - lost * t * arm ** 2 - area * shift ** 2
  return inertia / (depth / 2 + shift)
}

/**
 * Flexure of a rectangular HSS about one axis: yielding, flange and web local buckling, and about the strong axis
 * lateral-torsional buckling with Lb between points that stop twist. Refuses slender webs. N·mm. ANSI/AISC 360-22 F7.
 */
export function flexureBox(
  section: BoxSection,
  axis: Axis,
  E: number,
  Fy: number,
  Lb: number,
  Cb = 1,
): FlexureBox {
  const bent = turned(section, axis)
  const { S, Z, flangeRatio, webRatio } = bent
  const limits = boxLimits(E, Fy)
  if (webRatio > limits.webSlender) {
    refuse('section', `its wall of ${webRatio} is slender as a web in flexure; choose a thicker wall`)
  }
  const Mp = Fy * Z
  const slope = Math.sqrt(Fy / E)
  const yields = Fy * S
  const flange =
    flangeRatio <= limits.flangeCompact
      ? Mp
      : flangeRatio <= limits.flangeSlender
        ? Math.min(Mp, Mp - (Mp - yields) * (3.57 * flangeRatio * slope - 4))
        : Math.min(Mp, Fy * effectiveModulus(section, bent, E, Fy))
  const web =
    webRatio <= limits.webCompact ? Mp : Math.min(Mp, Mp - (Mp - yields) * (0.305 * webRatio * slope - 0.738))
  const { Lp, Lr, lateral } = lateralBox(section, axis, E, Fy, Mp, Lb, Cb)
  return { Mp, Lp, Lr, lateral, flange, web, nominal: Math.min(Mp, flange, web, lateral) }
}

/**
 * Lp = 0.13·E·ry·√(J·Ag)/Mp, Lr = 2·E·ry·√(J·Ag)/(0.7·Fy·Sx); elastic Mn = 2·E·Cb·√(J·Ag)/(Lb/ry). Square shapes and
 * bending about the weak axis do not buckle sideways. Eq. F7-10 to F7-13.
 */
function lateralBox(
  section: BoxSection,
  axis: Axis,
  E: number,
  Fy: number,
  Mp: number,
  Lb: number,
  Cb: number,
) {
  const { J, area, ry, Sx, depth, width } = section
  const root = Math.sqrt(J * area)
  const Lp = (0.13 * E * ry * root) / Mp
  const first = 0.7 * Fy * Sx
  const Lr = (2 * E * ry * root) / first
  if (axis === 'weak' || depth === width || Lb <= Lp) return { Lp, Lr, lateral: Mp }
  if (Lb <= Lr) return { Lp, Lr, lateral: Math.min(Mp, Cb * (Mp - ((Mp - first) * (Lb - Lp)) / (Lr - Lp))) }
  return { Lp, Lr, lateral: Math.min(Mp, (2 * E * Cb * root) / (Lb / ry)) }
}

/** Limits of a round HSS in flexure, Table B4.1b case 20: 0.07·E/Fy and 0.31·E/Fy. */
export function roundFlexureLimits(E: number, Fy: number): { compact: number; slender: number } {
  return { compact: (0.07 * E) / Fy, slender: (0.31 * E) / Fy }
}

/**
 * Flexure of a round HSS: Mp = Fy·Z; noncompact Mn = (0.021·E/(D/t) + Fy)·S; slender Mn = 0.33·E/(D/t)·S. N·mm.
 * Refuses D/t of 0.45·E/Fy and more. ANSI/AISC 360-22 F8.
 */
export function flexureRound(section: RoundSection, E: number, Fy: number): { Mp: number; nominal: number } {
  const { Zx, Sx, diameterRatio } = section
  if (diameterRatio >= roundRange(E, Fy)) {
    refuse('section', `its D/t of ${diameterRatio} is beyond F8; choose a thicker wall`)
  }
  const Mp = Fy * Zx
  const limits = roundFlexureLimits(E, Fy)
  if (diameterRatio <= limits.compact) return { Mp, nominal: Mp }
  const stress =
    diameterRatio <= limits.slender ? (0.021 * E) / diameterRatio + Fy : (0.33 * E) / diameterRatio
  return { Mp, nominal: Math.min(Mp, stress * Sx) }
}
