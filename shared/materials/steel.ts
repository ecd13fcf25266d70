import type { Family } from '../sections/section.ts'
import { MPA_PER_KSI } from '../units/convert.ts'

export interface Steel {
  /** Short name, such as `A992`. */
  name: string
  /** Standard and grade as written on an order. */
  title: string
  /** Yield and tensile strength, MPa; US steels are defined in ksi. */
  Fy: number
  Fu: number
  FyKsi: number
  FuKsi: number
  /** Families of shapes that are made of it. */
  families: readonly Family[]
  note?: string
}

/** Young's and shear modulus of ANSI/AISC 360, MPa: 29 000 and 11 200 ksi. */
export const E_AISC = 29_000 * MPA_PER_KSI
export const G_AISC = 11_200 * MPA_PER_KSI

/** Strengths in ksi. */
export function steelInKsi(
  name: string,
  title: string,
  FyKsi: number,
  FuKsi: number,
  families: readonly Family[] = [],
  note?: string,
): Steel {
  return {
    name,
    title,
    Fy: FyKsi * MPA_PER_KSI,
    Fu: FuKsi * MPA_PER_KSI,
    FyKsi,
    FuKsi,
    families,
    ...(note === undefined ? {} : { note }),
  }
}
