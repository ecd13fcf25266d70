import type { Method } from '../aisc360/resistance.ts'

export type Edition = 'ASCE 7-22' | 'ASCE 7-16'

/** Load cases by their letters in ASCE 7: dead, live, roof live, snow, rain, wind, earthquake, vertical earthquake. */
export const CASES = ['D', 'L', 'Lr', 'S', 'R', 'W', 'E', 'Ev'] as const
export type LoadCase = (typeof CASES)[number]
export type FactorSet = Partial<Record<LoadCase, number>>

/** Snow is a strength-level load in ASCE 7-22 and a service-level one in 7-16, hence its factors. */
interface SnowFactors {
  /** LRFD 2 and 4, companion; 3, leading; 6, with earthquake. */
  companion: number
  leading: number
  seismic: number
  /** ASD 3 leading; 4 and 6 companion; 9 with earthquake. */
  asd: number
  asdCompanion: number
  asdSeismic: number
}

const SNOW: Record<Edition, SnowFactors> = {
  'ASCE 7-22': {
    companion: 0.3,
    leading: 1,
    seismic: 0.15,
    asd: 0.7,
    asdCompanion: 0.75 * 0.7,
    asdSeismic: 0.1,
  },
  'ASCE 7-16': {
    companion: 0.5,
    leading: 1.6,
    seismic: 0.2,
    asd: 1,
    asdCompanion: 0.75,
    asdSeismic: 0.75,
  },
}

/**
 * Basic combinations for strength design. ASCE/SEI 7-22 2.3.1 (1 to 5) and 2.3.6 (6, 7); 7-16 alike but for snow.
 * f1 is the factor of live load beside other loads: 0.5, or 1.0 for garages, assembly and more than 100 psf.
 */
function lrfd(snow: SnowFactors, f1: number): FactorSet[] {
  const roof: FactorSet[] = [{ Lr: 0.5 }, { S: snow.companion }, { R: 0.5 }]
  const leadingRoof: FactorSet[] = [{ Lr: 1.6 }, { S: snow.leading }, { R: 1.6 }]
  return [
    { D: 1.4 },
    ...roof.map((extra) => ({ D: 1.2, L: 1.6, ...extra })),
    ...leadingRoof.flatMap((lead) => [
      { D: 1.2, ...lead, L: f1 },
      { D: 1.2, ...lead, W: 0.5 },
    ]),
    ...roof.map((extra) => ({ D: 1.2, W: 1, L: f1, ...extra })),
    { D: 0.9, W: 1 },
    { D: 1.2, Ev: 1, E: 1, L: f1, S: snow.seismic },
    { D: 0.9, Ev: -1, E: 1 },
  ]
}

/** Basic combinations for allowable stress design. ASCE/SEI 7-22 2.4.1 (1 to 7) and 2.4.5 (8 to 10); 7-16 alike but for snow. */
function asd(snow: SnowFactors): FactorSet[] {
  const leadingRoof: FactorSet[] = [{ Lr: 1 }, { S: snow.asd }, { R: 1 }]
  const roof: FactorSet[] = [{ Lr: 0.75 }, { S: snow.asdCompanion }, { R: 0.75 }]
  return [
    { D: 1 },
    { D: 1, L: 1 },
    ...leadingRoof.map((lead) => ({ D: 1, ...lead })),
    ...roof.map((extra) => ({ D: 1, L: 0.75, ...extra })),
    { D: 1, W: 0.6 },
    ...roof.map((extra) => ({ D: 1, L: 0.75, W: 0.45, ...extra })),
    { D: 0.6, W: 0.6 },
    { D: 1, Ev: 0.7, E: 0.7 },
    { D: 1, Ev: 0.525, E: 0.525, L: 0.75, S: snow.asdSeismic },
    { D: 0.6, Ev: -0.7, E: 0.7 },
  ]
}

/** The basic combinations of an edition, before the signs of wind and earthquake are chosen. */
export function basicCombinations(edition: Edition, method: Method, f1: number): FactorSet[] {
  return method === 'LRFD' ? lrfd(SNOW[edition], f1) : asd(SNOW[edition])
}
