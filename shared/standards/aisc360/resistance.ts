export type Method = 'LRFD' | 'ASD'

export interface Factors {
  /** Resistance factor, LRFD. */
  phi: number
  /** Safety factor, ASD. */
  omega: number
}

/**
 * Resistance and safety factors. ANSI/AISC 360-22: E1 compression, D2 tension, J2 fillet welds, J3.7 and J9 rods,
 * J8 bearing on concrete, F1 bending of plates.
 */
export const FACTORS = {
  compression: { phi: 0.9, omega: 1.67 },
  flexure: { phi: 0.9, omega: 1.67 },
  tensionYield: { phi: 0.9, omega: 1.67 },
  tensionRupture: { phi: 0.75, omega: 2 },
  plateBending: { phi: 0.9, omega: 1.67 },
  rod: { phi: 0.75, omega: 2 },
  weld: { phi: 0.75, omega: 2 },
  concreteBearing: { phi: 0.65, omega: 2.31 },
} as const satisfies Record<string, Factors>

/** Available strength of a nominal one: φ·Rn (B3.1, LRFD) or Rn/Ω (B3.2, ASD). */
export function available(nominal: number, factors: Factors, method: Method): number {
  return method === 'LRFD' ? factors.phi * nominal : nominal / factors.omega
}
