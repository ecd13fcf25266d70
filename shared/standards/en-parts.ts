import type { Steel } from '../materials/steel.ts'
import type { Section } from '../sections/section.ts'
import { classOf } from './en1993/classification.ts'
import { governingModeEn, modesEn, type ModeEn } from './en1993/compression.ts'
import { bucklingCheckEn, classChecks, tensionCheckEn } from './en1993/checks.ts'
import { effectiveAreaEn } from './en1993/effective-area.ts'
import type { PreparedColumn } from './prepare-column.ts'
import { lengthsOf, type Screening } from './screen-column.ts'
import type { StandardParts } from './standard-parts.ts'

/** The checks of EN 1993-1-1 with their steps. */
export function enParts(
  prepared: PreparedColumn,
  section: Section,
  { Fy }: Steel,
  { compression, uplift }: Screening,
): StandardParts {
  const modes = modesEn(section, Fy, lengthsOf(prepared))
  const mode = governingModeEn(modes)
  const flexural = mode.name !== 'torsion'
  return {
    governing: {
      check: flexural ? 'compression' : 'torsional buckling',
      axis: mode.name,
      clause: '6.3.1',
    },
    tensionClause: '6.2.3',
    values: valuesOf(section, Fy, modes, mode),
    checks: [
      ...modes.map((one) => bucklingCheckEn(section, Fy, one, compression)),
      ...classChecks(section, Fy),
      ...(uplift > 0 ? [tensionCheckEn(section, Fy, uplift)] : []),
    ],
  }
}

const capital = (name: string) => name[0]?.toUpperCase() + name.slice(1)

function valuesOf(
  section: Section,
  Fy: number,
  modes: readonly ModeEn[],
  mode: ModeEn,
): Record<string, number | string> {
  const perMode = modes.flatMap(({ name, chi, lambda, curve, resistance }) => [
    [`chi${capital(name)}`, chi],
    [`lambdaBar${capital(name)}`, lambda],
    [`curve${capital(name)}`, curve],
    [`resistance${capital(name)}`, resistance],
  ])
  return {
    Fe: mode.Ncr / section.area,
    Fn: mode.chi * Fy,
    effectiveArea: effectiveAreaEn(section, Fy),
    nominal: mode.resistance,
    class: classOf(section, Fy),
    chi: mode.chi,
    lambdaBar: mode.lambda,
    ...(Object.fromEntries(perMode) as Record<string, number | string>),
  }
}
