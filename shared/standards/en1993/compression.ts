import { E_EN, G_EN } from '../../materials/european-steels.ts'
import type { Section } from '../../sections/section.ts'
import {
  bucklingReduction,
  curvesOf,
  elasticLoadEn,
  relativeSlenderness,
  torsionalLoad,
  type Curve,
} from './buckling.ts'
import { effectiveAreaEn } from './effective-area.ts'

/** One way of buckling by EN 1993-1-1 6.3.1: N, mm. */
export interface ModeEn {
  name: 'strong' | 'weak' | 'torsion'
  length: number
  curve: Curve
  Ncr: number
  lambda: number
  chi: number
  /** Nb,Rd = χ·Aeff·fy/γM1. */
  resistance: number
}

export interface LengthsEn {
  strong: number
  weak: number
  torsion: number
}

/** γM0 and γM1: national choice, 1.0 where nothing else is set. */
export const GAMMA_M0 = 1
export const GAMMA_M1 = 1

/** Every mode of a section in uniform compression; torsion for I alone, on the curve of the weak axis. */
export function modesEn(section: Section, fy: number, lengths: LengthsEn): ModeEn[] {
  const Aeff = effectiveAreaEn(section, fy)
  const curves = curvesOf(section)
  const mode = (name: ModeEn['name'], length: number, curve: Curve, Ncr: number): ModeEn => {
    const lambda = relativeSlenderness(Aeff, fy, Ncr)
    const chi = bucklingReduction(lambda, curve)
    return { name, length, curve, Ncr, lambda, chi, resistance: (chi * Aeff * fy) / GAMMA_M1 }
  }
  const { strong, weak, torsion } = lengths
  const modes = [
    mode('strong', strong, curves.strong, elasticLoadEn(E_EN * section.Ix, strong)),
    mode('weak', weak, curves.weak, elasticLoadEn(E_EN * section.Iy, weak)),
  ]
  if (section.shape !== 'I') return modes
  return [...modes, mode('torsion', torsion, curves.weak, torsionalLoad(section, E_EN, G_EN, torsion))]
}

export function governingModeEn(modes: readonly ModeEn[]): ModeEn {
  return modes.reduce((least, mode) => (mode.resistance < least.resistance ? mode : least))
}

/** Npl,Rd = A·fy/γM0, N. EN 1993-1-1 Eq. 6.6; a shaft without holes. */
export function tensionEn(area: number, fy: number): number {
  return (area * fy) / GAMMA_M0
}
