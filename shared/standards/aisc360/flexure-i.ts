import type { ISection } from '../../sections/section.ts'
import { refuse } from '../../units/refusal.ts'
import { webStiffening } from './local-slenderness.ts'

/** Strength of one limit state after another, N·mm, with what leads to them; lengths mm. */
export interface FlexureI {
  /** Plastic moment. */
  Mp: number
  Lp: number
  Lr: number
  lateral: number
  flange: number
  nominal: number
}

/** Limits of a flange in flexure, Table B4.1b case 10: 0.38 and 1.0·√(E/Fy). */
export function flangeLimits(E: number, Fy: number): { compact: number; slender: number } {
  const q = Math.sqrt(E / Fy)
  return { compact: 0.38 * q, slender: 1.0 * q }
}

/** λp of a web in flexure, Table B4.1b case 15: 3.76·√(E/Fy). */
export function webFlexureLimit(E: number, Fy: number): number {
  return 3.76 * Math.sqrt(E / Fy)
}

/** Part of Mp beyond first yield that is lost on the way from λp to λr: residual stress leaves 0.7·Fy·S. */
function between(Mp: number, first: number, share: number): number {
  return Mp - (Mp - first) * share
}

/** Lp = 1.76·ry·√(E/Fy), mm. Eq. F2-5. */
export function lateralPlasticLength(ry: number, E: number, Fy: number): number {
  return 1.76 * ry * Math.sqrt(E / Fy)
}

/**
 * Lr = 1.95·rts·(E/0.7Fy)·√(j + √(j² + 6.76·(0.7Fy/E)²)), j = J·c/(Sx·ho), c = 1 for doubly symmetric shapes. mm.
 * ANSI/AISC 360-22 Eq. F2-6.
 */
export function lateralElasticLength({ rts, J, Sx, ho }: ISection, E: number, Fy: number): number {
  const j = J / (Sx * ho)
  const yields = (0.7 * Fy) / E
  return ((1.95 * rts) / yields) * Math.sqrt(j + Math.sqrt(j ** 2 + 6.76 * yields ** 2))
}

/** Elastic lateral-torsional stress: Fcr = Cb·π²·E/(Lb/rts)²·√(1 + 0.078·j·(Lb/rts)²), MPa. Eq. F2-4. */
export function lateralStress({ rts, J, Sx, ho }: ISection, E: number, Lb: number, Cb: number): number {
  const slender = (Lb / rts) ** 2
  return ((Cb * Math.PI ** 2 * E) / slender) * Math.sqrt(1 + ((0.078 * J) / (Sx * ho)) * slender)
}

/**
 * Strong-axis flexure of a doubly symmetric I: yielding, lateral-torsional buckling (F2) and flange local buckling (F3).
 * Lb between points that stop twist, mm. Refuses a web that is not compact. Moments N·mm. ANSI/AISC 360-22 F2, F3.
 */
export function strongFlexureI(section: ISection, E: number, Fy: number, Lb: number, Cb = 1): FlexureI {
  const { Zx, Sx, ry, flangeRatio, webRatio } = section
  if (webRatio > webFlexureLimit(E, Fy)) {
    refuse('section', `its web of h/tw ${webRatio} is not compact in flexure; choose a thicker web`)
  }
  const Mp = Fy * Zx
  const first = 0.7 * Fy * Sx
  const Lp = lateralPlasticLength(ry, E, Fy)
  const Lr = lateralElasticLength(section, E, Fy)
  const lateral = lateralMoment(section, E, { Mp, first, Lp, Lr, Lb, Cb })
  const flange = flangeMoment(
    Mp,
    first,
    flangeRatio,
    E,
    Fy,
    () => (0.9 * E * webStiffening(webRatio) * Sx) / flangeRatio ** 2,
  )
  return { Mp, Lp, Lr, lateral, flange, nominal: Math.min(Mp, lateral, flange) }
}

function lateralMoment(
  section: ISection,
  E: number,
  {
    Mp,
    first,
    Lp,
    Lr,
    Lb,
    Cb,
  }: { Mp: number; first: number; Lp: number; Lr: number; Lb: number; Cb: number },
): number {
  if (Lb <= Lp) return Mp
  if (Lb <= Lr) return Math.min(Mp, Cb * between(Mp, first, (Lb - Lp) / (Lr - Lp)))
  return Math.min(Mp, lateralStress(section, E, Lb, Cb) * section.Sx)
}

/** Mp for a compact flange, the line between for a noncompact one (F3-1, F6-2), `slender` beyond. */
function flangeMoment(
  Mp: number,
  first: number,
  ratio: number,
  E: number,
  Fy: number,
  slender: () => number,
): number {
  const limits = flangeLimits(E, Fy)
  if (ratio <= limits.compact) return Mp
  if (ratio > limits.slender) return Math.min(Mp, slender())
  return between(Mp, first, (ratio - limits.compact) / (limits.slender - limits.compact))
}

/** Coefficient of slender flanges in weak-axis flexure: Fcr = 0.70·E/λ² in 360-22, 0.69·E/λ² in 360-16. Eq. F6-4. */
export const WEAK_FLANGE = { 'AISC 360-22': 0.7, 'AISC 360-16': 0.69 } as const

/**
 * Weak-axis flexure of an I: yielding, Mp = min(Fy·Zy, 1.6·Fy·Sy), and flange local buckling. N·mm.
 * ANSI/AISC 360-22 F6.
 */
export function weakFlexureI(
  section: ISection,
  E: number,
  Fy: number,
  edition: keyof typeof WEAK_FLANGE,
): { Mp: number; flange: number; nominal: number } {
  const { Zy, Sy, flangeRatio } = section
  const Mp = Math.min(Fy * Zy, 1.6 * Fy * Sy)
  const flange = flangeMoment(
    Mp,
    0.7 * Fy * Sy,
    flangeRatio,
    E,
    Fy,
    () => (WEAK_FLANGE[edition] * E * Sy) / flangeRatio ** 2,
  )
  return { Mp, flange, nominal: Math.min(Mp, flange) }
}
