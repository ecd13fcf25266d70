/**
 * Elastic buckling stress in bending: Fe = π²·E/(Lc/r)².
 * E Young's modulus, MPa; slenderness Lc/r more than 0. MPa.
 * ANSI/AISC 360-22 Eq. E3-4 (360-16 alike).
 */
export function eulerStress(E: number, slendernessRatio: number): number {
  return (Math.PI ** 2 * E) / slendernessRatio ** 2
}

/** Fy/Fe up to which buckling is inelastic: E3(a), E3(b). */
export const INELASTIC_LIMIT = 2.25

/**
 * Nominal stress: Fn = 0.658^(Fy/Fe)·Fy for Fy/Fe ≤ 2.25, else Fn = 0.877·Fe.
 * Fy yield and Fe elastic buckling stress (E3 or E4), MPa, more than 0.
 * ANSI/AISC 360-22 Eq. E3-2, E3-3 (360-16 alike).
 */
export function nominalStress(Fy: number, Fe: number): number {
  return Fy / Fe <= INELASTIC_LIMIT ? 0.658 ** (Fy / Fe) * Fy : 0.877 * Fe
}
