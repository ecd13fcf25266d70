import type { Family } from '../sections/section.ts'
import { refuse } from '../units/refusal.ts'
import { MPA_PER_KSI } from '../units/convert.ts'
import { steelInKsi, type Steel } from './steel.ts'

const TUBES: readonly Family[] = ['HSS_SQUARE', 'HSS_RECT', 'HSS_ROUND']

/** Steels of US shapes: AISC Manual, Tables 2-4; the values are those of each ASTM standard. */
export const SHAPE_STEELS: readonly Steel[] = [
  steelInKsi('A992', 'ASTM A992', 50, 65, ['W']),
  steelInKsi('A572-50', 'ASTM A572 Grade 50', 50, 65, ['W']),
  steelInKsi('A36', 'ASTM A36', 36, 58, ['W']),
  steelInKsi('A500-C', 'ASTM A500 Grade C', 50, 62, TUBES),
  steelInKsi(
    'A1085',
    'ASTM A1085',
    50,
    65,
    TUBES,
    'Computed with the design wall of A500 (0.93 of nominal); A1085 tube has its full wall, so this errs on the safe side.',
  ),
  steelInKsi('A53-B', 'ASTM A53 Grade B', 35, 60, ['PIPE']),
]

/** A500 Grade C round before A500-21, as in the 15th edition of the Manual and older ones. */
const A500_C_ROUND_OLDER = steelInKsi('A500-C', 'ASTM A500 Grade C, before A500-21', 46, 62, ['HSS_ROUND'])

export interface SteelSettings {
  /** Take round A500 Grade C at 46 ksi, as before A500-21. */
  olderRoundTube?: boolean
}

const DEFAULTS: Partial<Record<Family, string>> = {
  W: 'A992',
  HSS_SQUARE: 'A500-C',
  HSS_RECT: 'A500-C',
  HSS_ROUND: 'A500-C',
  PIPE: 'A53-B',
}

function normalise(name: string): string {
  return name.toUpperCase().replaceAll(/ASTM|GRADE|GR\.?|[\s-]/g, '')
}

/** The steels that a family is made of, its usual one first. */
export function steelsFor(family: Family, settings: SteelSettings = {}): Steel[] {
  const usual = DEFAULTS[family]
  return SHAPE_STEELS.filter((steel) => steel.families.includes(family))
    .map((steel) =>
      steel.name === 'A500-C' && family === 'HSS_ROUND' && settings.olderRoundTube
        ? A500_C_ROUND_OLDER
        : steel,
    )
    .sort((a, b) => Number(b.name === usual) - Number(a.name === usual))
}

/** The usual steel of a family; `undefined` for families without one here. */
export function defaultSteel(family: Family, settings: SteelSettings = {}): Steel | undefined {
  return steelsFor(family, settings)[0]
}

/** A steel stated by its strengths, MPa. */
export function statedSteel(Fy: number, Fu: number): Steel {
  const name = `Fy ${Math.round(Fy)} MPa`
  return { name, title: name, Fy, Fu, FyKsi: Fy / MPA_PER_KSI, FuKsi: Fu / MPA_PER_KSI, families: [] }
}

/**
 * The steel of a shape from what was asked: a name, strengths in MPa, or nothing for the usual one.
 * Refuses names that are unknown or that the family is not made of.
 */
export function steelOf(
  asked: string | { yield: number; ultimate: number } | undefined,
  family: Family,
  settings: SteelSettings = {},
): Steel {
  const choices = steelsFor(family, settings)
  if (typeof asked === 'object') {
    if (asked.ultimate < asked.yield) refuse('grade.ultimate', 'tensile strength is not less than yield')
    return statedSteel(asked.yield, asked.ultimate)
  }
  const found =
    asked === undefined ? choices[0] : choices.find((steel) => normalise(steel.name) === normalise(asked))
  if (found) return found
  const names = choices.map((steel) => steel.name).join(', ')
  return refuse('grade', names ? `this shape is made of ${names}` : 'no steel is listed for this family yet')
}
