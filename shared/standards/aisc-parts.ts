import { E_AISC, type Steel } from '../materials/steel.ts'
import type { Section } from '../sections/section.ts'
import { compressionCheck } from './aisc360/compression-check.ts'
import { bucklingModes, governingMode, nominalCompression, type Mode } from './aisc360/compression.ts'
import { effectiveArea } from './aisc360/effective-area.ts'
import { localChecks } from './aisc360/local-check.ts'
import { tensionCheck } from './aisc360/tension-check.ts'
import { bendingChecks } from './bending-checks.ts'
import type { AiscTerms } from './column-request.ts'
import type { PreparedColumn } from './prepare-column.ts'
import { compressionInput, type Screening } from './screen-column.ts'
import type { BentScreening } from './screen-bending.ts'
import type { StandardParts } from './standard-parts.ts'

/** The checks of AISC 360 with their steps. */
export function aiscParts(
  prepared: PreparedColumn,
  terms: AiscTerms,
  section: Section,
  steel: Steel,
  screening: Screening,
): StandardParts {
  const { method } = terms
  const input = compressionInput(prepared, steel.Fy)
  const modes = bucklingModes(section, input)
  const mode = governingMode(modes)
  const { bending } = prepared
  const { bent, compression, uplift } = screening
  return {
    governing: governingCheck(mode),
    tensionClause: 'D2',
    values: valuesOf(section, steel.Fy, mode, bent),
    checks: [
      ...modes.map((one) => compressionCheck(section, one, input, method, compression)),
      ...localChecks(section, E_AISC, steel.Fy, mode.Fn),
      ...(uplift > 0 ? [tensionCheck(section, steel, method, uplift)] : []),
      ...(bending && bent ? bendingChecks(prepared, terms, bending, section, steel.Fy, bent, screening) : []),
    ],
  }
}

function governingCheck({ name, clause }: Mode): StandardParts['governing'] {
  const flexural = name === 'strong' || name === 'weak'
  return { check: flexural ? 'compression' : 'torsional buckling', axis: flexural ? name : 'torsion', clause }
}

function valuesOf(
  section: Section,
  Fy: number,
  mode: Mode,
  bent: BentScreening | undefined,
): Record<string, number> {
  return {
    Fe: mode.Fe,
    Fn: mode.Fn,
    effectiveArea: effectiveArea(section, E_AISC, Fy, mode.Fn),
    nominal: nominalCompression(section, mode, E_AISC, Fy),
    ...(bent ? bentValues(bent) : {}),
  }
}

function bentValues(bent: BentScreening): Record<string, number> {
  const { capacityStrong, capacityWeak, amplifierStrong, amplifierWeak, utilisation, demand } = bent
  return {
    momentAvailableStrong: capacityStrong,
    momentAvailableWeak: capacityWeak,
    momentStrong: demand.momentStrong,
    momentWeak: demand.momentWeak,
    // Left out where the column is unstable: it has none.
    ...(amplifierStrong === undefined ? {} : { amplifierStrong }),
    ...(amplifierWeak === undefined ? {} : { amplifierWeak }),
    interaction: utilisation,
  }
}
