import type { ISection } from '../../sections/section.ts'

type TorsionProperties = Pick<ISection, 'area' | 'Ix' | 'Iy' | 'J' | 'Cw' | 'rx' | 'ry' | 'ho'>

/**
 * Elastic torsional buckling stress of a doubly symmetric I: Fe = [π²·E·Cw/Lcz² + G·J]/(Ix + Iy).
 * E, G MPa; Cw mm⁶; J, Ix, Iy mm⁴; Lcz effective length for twist, mm, more than 0. MPa.
 * ANSI/AISC 360-22 Eq. E4-2 (360-16 alike).
 */
export function torsionalStress(E: number, G: number, section: TorsionProperties, Lcz: number): number {
  const { Cw, J, Ix, Iy } = section
  return ((Math.PI ** 2 * E * Cw) / Lcz ** 2 + G * J) / (Ix + Iy)
}

/** Polar radius of gyration about an axis ya from the shear centre: ro² = rx² + ry² + ya². mm². E4(d). */
export function polarRadiusSquared(section: Pick<ISection, 'rx' | 'ry'>, ya: number): number {
  return section.rx ** 2 + section.ry ** 2 + ya ** 2
}

/**
 * Elastic constrained-axis torsional buckling stress of a doubly symmetric I whose weak axis is braced off its shear centre
 * by braces that do not stop twist: Fe = [π²·E·Iy/Lcz²·(ho²/4 + ya²) + G·J]/(A·ro²), ro² = rx² + ry² + ya².
 * ya distance of the braces from the shear centre along the depth, mm; other symbols as in `torsionalStress`. MPa.
 * ANSI/AISC 360-22 E4(d); not in 360-16.
 */
export function constrainedAxisStress(
  E: number,
  G: number,
  section: TorsionProperties,
  Lcz: number,
  ya: number,
): number {
  const { area, Iy, J, ho } = section
  const warping = ((Math.PI ** 2 * E * Iy) / Lcz ** 2) * (ho ** 2 / 4 + ya ** 2)
  return (warping + G * J) / (area * polarRadiusSquared(section, ya))
}
