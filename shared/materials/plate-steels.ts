import { steelInKsi, type Steel } from './steel.ts'

/** Steels of base and cap plates: AISC Manual, Table 2-5. */
export const PLATE_STEELS: readonly Steel[] = [
  steelInKsi('A36', 'ASTM A36', 36, 58),
  steelInKsi('A572-50', 'ASTM A572 Grade 50', 50, 65),
]

/** Anchor rods: ASTM F1554, tensile strength the least of its range. */
export const ROD_STEELS: readonly Steel[] = [
  steelInKsi('F1554-36', 'ASTM F1554 Grade 36', 36, 58),
  steelInKsi('F1554-55', 'ASTM F1554 Grade 55', 55, 75),
  steelInKsi('F1554-105', 'ASTM F1554 Grade 105', 105, 125),
]

export function plateSteel(name: string): Steel | undefined {
  return PLATE_STEELS.find((steel) => steel.name === name.trim().toUpperCase())
}

export function rodSteel(name: string): Steel | undefined {
  return ROD_STEELS.find((steel) => steel.name === name.trim().toUpperCase())
}
