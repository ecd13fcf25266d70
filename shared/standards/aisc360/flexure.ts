import type { Section } from '../../sections/section.ts'
import { flexureBox, flexureRound, type Axis } from './flexure-hss.ts'
import { strongFlexureI, weakFlexureI, type WEAK_FLANGE } from './flexure-i.ts'

export interface FlexureTerms {
  E: number
  Fy: number
  /** Between points that stop twist, mm. */
  Lb: number
  edition: keyof typeof WEAK_FLANGE
}

/** Nominal flexural strength about one axis, N·mm; Cb is taken as 1. ANSI/AISC 360-22 F2, F3, F6, F7, F8. */
export function nominalFlexure(section: Section, axis: Axis, { E, Fy, Lb, edition }: FlexureTerms): number {
  switch (section.shape) {
    case 'I':
      return axis === 'strong'
        ? strongFlexureI(section, E, Fy, Lb).nominal
        : weakFlexureI(section, E, Fy, edition).nominal
    case 'box':
      return flexureBox(section, axis, E, Fy, Lb).nominal
    case 'round':
      return flexureRound(section, E, Fy).nominal
  }
}
