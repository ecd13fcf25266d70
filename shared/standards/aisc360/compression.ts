import type { Section } from '../../sections/section.ts'
import { effectiveArea } from './effective-area.ts'
import { eulerStress, nominalStress } from './flexural-buckling.ts'
import { slenderness } from './slenderness.ts'
import { constrainedAxisStress, torsionalStress } from './torsional-buckling.ts'

export type ModeName = 'strong' | 'weak' | 'torsion' | 'constrained axis'

/** A way in which a column can buckle as a whole. Stresses MPa, area mm², strength N. */
export interface Mode {
  name: ModeName
  clause: 'E3' | 'E4' | 'E4(d)'
  /** Effective length, mm. */
  Lc: number
  /** Offset of the braces from the shear centre, mm; only for `constrained axis`. */
  ya?: number
  Fe: number
  Fn: number
}

export interface CompressionInput {
  E: number
  G: number
  Fy: number
  /** Effective lengths, mm. */
  strong: number
  weak: number
  torsion: number
  /** Offsets of weak-axis braces that do not stop twist, mm. */
  braceOffsets?: readonly number[]
}

/**
 * Every mode of a doubly symmetric member in uniform compression with its stresses: E3 about both axes, and for an I
 * E4(a) and, where its weak axis is braced off the centre, E4(d). Hollow shapes do not buckle by twist.
 */
export function bucklingModes(section: Section, input: CompressionInput): Mode[] {
  const { E, G, Fy, strong, weak, torsion, braceOffsets = [] } = input
  const mode = (name: ModeName, clause: Mode['clause'], Lc: number, Fe: number): Mode => {
    return { name, clause, Lc, Fe, Fn: nominalStress(Fy, Fe) }
  }
  const modes = [
    mode('strong', 'E3', strong, eulerStress(E, slenderness(strong, section.rx))),
    mode('weak', 'E3', weak, eulerStress(E, slenderness(weak, section.ry))),
  ]
  if (section.shape !== 'I') return modes
  modes.push(mode('torsion', 'E4', torsion, torsionalStress(E, G, section, torsion)))
  for (const ya of braceOffsets) {
    const Fe = constrainedAxisStress(E, G, section, torsion, ya)
    modes.push({ ...mode('constrained axis', 'E4(d)', torsion, Fe), ya })
  }
  return modes
}

/** The mode that buckles first. Fn·Ae grows with Fn (E7), so the lowest Fe decides also for slender elements. */
export function governingMode(modes: readonly Mode[]): Mode {
  return modes.reduce((lowest, mode) => (mode.Fe < lowest.Fe ? mode : lowest))
}

/** Nominal strength in one mode: Pn = Fn·Ae, N. ANSI/AISC 360-22 Eq. E3-1, E7-1. */
export function nominalCompression(section: Section, mode: Pick<Mode, 'Fn'>, E: number, Fy: number): number {
  return mode.Fn * effectiveArea(section, E, Fy, mode.Fn)
}

/** The lowest Fe of `bucklingModes`, without the modes. MPa. */
export function lowestStress(section: Section, input: CompressionInput): number {
  const { E, G, strong, weak, torsion, braceOffsets = [] } = input
  const flexural = Math.min(
    eulerStress(E, slenderness(strong, section.rx)),
    eulerStress(E, slenderness(weak, section.ry)),
  )
  if (section.shape !== 'I') return flexural
  let lowest = Math.min(flexural, torsionalStress(E, G, section, torsion))
  for (const ya of braceOffsets) lowest = Math.min(lowest, constrainedAxisStress(E, G, section, torsion, ya))
  return lowest
}
