import { available, FACTORS, type Method } from './resistance.ts'

/** Yield of the gross section: Pn = Fy·Ag, N. ANSI/AISC 360-22 Eq. D2-1. Fy MPa, Ag mm². */
export function tensionYield(Fy: number, area: number): number {
  return Fy * area
}

/**
 * Rupture of the effective net section: Pn = Fu·Ae, N. Ae = Ag for a shaft without holes welded all round to its plate.
 * ANSI/AISC 360-22 Eq. D2-2. Fu MPa, Ae mm².
 */
export function tensionRupture(Fu: number, area: number): number {
  return Fu * area
}

/** Available tensile strength of a shaft without holes: the lesser of yield and rupture, N. D2. */
export function availableTension(Fy: number, Fu: number, area: number, method: Method): number {
  return Math.min(
    available(tensionYield(Fy, area), FACTORS.tensionYield, method),
    available(tensionRupture(Fu, area), FACTORS.tensionRupture, method),
  )
}
