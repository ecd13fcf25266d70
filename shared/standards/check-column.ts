import { E_AISC, type Steel } from '../materials/steel.ts'
import type { Section } from '../sections/section.ts'
import { lengthsWithStiffness, type ColumnLengths } from '../stability/column-lengths.ts'
import type { Check } from '../units/step.ts'
import { compressionCheck } from './aisc360/compression-check.ts'
import { bucklingModes, governingMode, nominalCompression, type Mode } from './aisc360/compression.ts'
import { effectiveArea } from './aisc360/effective-area.ts'
import { localChecks } from './aisc360/local-check.ts'
import { slenderness } from './aisc360/slenderness.ts'
import { tensionCheck } from './aisc360/tension-check.ts'
import { bendingChecks } from './bending-checks.ts'
import { assumptionsOf, notCoveredOf, warningsOf } from './column-words.ts'
import { demandOf, type PreparedColumn } from './prepare-column.ts'
import { requiredSteps } from './required-steps.ts'
import { compressionInput, screenColumn, type Screening } from './screen-column.ts'
import type { BentScreening } from './screen-bending.ts'

/** The whole answer for one shape: verdict, lengths by both methods, every check with its steps. N, mm, MPa. */
export interface ColumnCheck {
  verdict: 'holds' | 'fails'
  utilisation: number
  governing: { check: string; axis: string; clause: string; combination: string }
  lengths: ColumnLengths
  values: Record<string, number>
  checks: Check[]
  assumptions: string[]
  warnings: string[]
  notCovered: string[]
}

/**
 * Checks a shape as the column that was prepared, by AISC 360: E2, E3, E4, B4.1a, E7 in compression, D2 in uplift.
 * The same clause functions as `screenColumn`, with their steps. Refuses a round shape beyond the range of E7.2.
 */
export function checkColumn(prepared: PreparedColumn, section: Section, steel: Steel): ColumnCheck {
  const screening = screenColumn(prepared, section, steel)
  const input = compressionInput(prepared, steel.Fy)
  const modes = bucklingModes(section, input)
  const mode = governingMode(modes)
  const demand = demandOf(prepared, section.mass)
  const { method, combinations } = prepared.terms
  const lengths = lengthsWithStiffness(prepared.solution, E_AISC * section.Ix, E_AISC * section.Iy)
  const tension = tensionCheck(section, steel, method, demand.uplift)
  const inUplift = demand.uplift / screening.tension > demand.compression / screening.capacity
  const required: Check = {
    clause: prepared.request.required ? 'as given' : combinations,
    title: 'Required and available strength',
    demand: inUplift ? demand.uplift : demand.compression,
    capacity: inUplift ? screening.tension : screening.capacity,
    unit: 'N',
    utilisation: inUplift ? demand.uplift / screening.tension : demand.compression / screening.capacity,
    steps: [
      ...requiredSteps(prepared, section.mass, demand.compressionBy, 'Pr'),
      ...(demand.uplift > 0 ? requiredSteps(prepared, section.mass, demand.upliftBy, 'Tr').slice(-1) : []),
    ],
    notes: [],
  }
  const { bent } = screening
  const byBending = bent !== undefined && bent.utilisation >= screening.utilisation
  const governing = byBending
    ? { check: 'interaction', axis: '', clause: 'H1', combination: bent.demand.combination.name }
    : inUplift
      ? { check: 'tension', axis: '', clause: 'D2', combination: demand.upliftBy.name }
      : { ...governingCheck(mode), combination: demand.compressionBy.name }
  return {
    verdict: screening.utilisation <= 1 ? 'holds' : 'fails',
    utilisation: screening.utilisation,
    governing,
    lengths,
    values: valuesOf(section, steel, mode, screening, lengths),
    checks: [
      required,
      ...modes.map((one) => compressionCheck(section, one, input, method, demand.compression)),
      ...localChecks(section, E_AISC, steel.Fy, mode.Fn),
      ...(demand.uplift > 0 ? [tension] : []),
      ...(prepared.bending && bent
        ? bendingChecks(prepared, prepared.bending, section, steel.Fy, bent, screening)
        : []),
    ],
    assumptions: assumptionsOf(prepared, steel),
    warnings: warningsOf(prepared, section, lengths, demand.uplift),
    notCovered: notCoveredOf(),
  }
}

function governingCheck({ name, clause }: Mode): { check: string; axis: string; clause: string } {
  const flexural = name === 'strong' || name === 'weak'
  return { check: flexural ? 'compression' : 'torsional buckling', axis: flexural ? name : 'torsion', clause }
}

function valuesOf(
  section: Section,
  { Fy, Fu }: Steel,
  mode: Mode,
  { capacity, tension, compression, uplift, bent }: Screening,
  lengths: ColumnLengths,
): Record<string, number> {
  return {
    area: section.area,
    yield: Fy,
    ultimate: Fu,
    slendernessStrong: slenderness(lengths.strong.used, section.rx),
    slendernessWeak: slenderness(lengths.weak.used, section.ry),
    Fe: mode.Fe,
    Fn: mode.Fn,
    effectiveArea: effectiveArea(section, E_AISC, Fy, mode.Fn),
    nominal: nominalCompression(section, mode, E_AISC, Fy),
    available: capacity,
    required: compression,
    tensionAvailable: tension,
    uplift,
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
