import { MPA_PER_KSI } from '../units/convert.ts'
import { available, FACTORS, type Method } from '../standards/aisc360/resistance.ts'

/** Strength of E70 electrodes, MPa. */
export const E70 = 70 * MPA_PER_KSI

/** Least fillet leg by the thinner part joined, mm. AISC 360-22 Table J2.4, metric sizes. */
export function leastLeg(thinner: number): number {
  if (thinner <= 6) return 3
  if (thinner <= 13) return 5
  return thinner <= 19 ? 6 : 8
}

/** Effective throat of an equal-legged fillet: 0.707 of its leg. */
const THROAT = Math.SQRT1_2

/**
 * Nominal strength of a fillet weld: Rn = 0.60·FEXX·(0.707·leg)·length, N. Leg and length mm; without the increase for
 * direction. AISC 360-22 J2.4, Table J2.5.
 */
export function filletNominal(leg: number, length: number): number {
  return 0.6 * E70 * THROAT * leg * length
}

export function filletAvailable(leg: number, length: number, method: Method): number {
  return available(filletNominal(leg, length), FACTORS.weld, method)
}
