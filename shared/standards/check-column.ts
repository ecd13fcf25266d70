import { E_EN } from '../materials/european-steels.ts'
import { E_AISC, type Steel } from '../materials/steel.ts'
import type { Section } from '../sections/section.ts'
import { lengthsWithStiffness, type ColumnLengths } from '../stability/column-lengths.ts'
import type { Check } from '../units/step.ts'
import { aiscParts } from './aisc-parts.ts'
import { slenderness } from './aisc360/slenderness.ts'
import { braceNeeds, type BraceNeed } from './brace-needs.ts'
import { assumptionsOf, notCoveredOf, warningsOf } from './column-words.ts'
import { enParts } from './en-parts.ts'
import { checkFamily } from './families.ts'
import { demandOf, type PreparedColumn } from './prepare-column.ts'
import { requiredSteps } from './required-steps.ts'
import { screenColumn, type Screening } from './screen-column.ts'
import type { Governing, StandardParts } from './standard-parts.ts'

/** The whole answer for one shape: verdict, lengths by both methods, every check with its steps. N, mm, MPa. */
export interface ColumnCheck {
  verdict: 'holds' | 'fails'
  utilisation: number
  governing: Governing
  lengths: ColumnLengths
  /** What each brace must give. */
  braces: BraceNeed[]
  values: Record<string, number | string>
  checks: Check[]
  assumptions: string[]
  warnings: string[]
  notCovered: string[]
}

/**
 * Checks a shape as the column that was prepared: AISC 360 E2, E3, E4, B4.1a, E7, D2, and with moments F, Appendix 8 and
 * H1; or EN 1993-1-1 5.5, 6.2.3, 6.3.1 with EN 1993-1-5. The same clause functions as `screenColumn`, with their steps.
 * Refuses what `screenColumn` refuses.
 */
export function checkColumn(prepared: PreparedColumn, section: Section, steel: Steel): ColumnCheck {
  checkFamily(section, prepared.terms.standard)
  const screening = screenColumn(prepared, section, steel)
  const { terms, solution } = prepared
  const E = terms.standard === 'EN 1993-1-1' ? E_EN : E_AISC
  const lengths = lengthsWithStiffness(solution, E * section.Ix, E * section.Iy)
  const parts =
    terms.standard === 'EN 1993-1-1'
      ? enParts(prepared, section, steel, screening)
      : aiscParts(prepared, terms, section, steel, screening)
  return {
    verdict: screening.utilisation <= 1 ? 'holds' : 'fails',
    utilisation: screening.utilisation,
    governing: governingOf(prepared, section, screening, parts),
    lengths,
    braces: braceNeeds(prepared, screening.compression),
    values: { ...commonValues(section, steel, screening, lengths), ...parts.values },
    checks: [requiredCheck(prepared, section, screening), ...parts.checks],
    assumptions: assumptionsOf(prepared, steel),
    warnings: warningsOf(prepared, section, lengths, screening.uplift),
    notCovered: notCoveredOf(),
  }
}

function isInUplift({ uplift, tension, compression, capacity }: Screening): boolean {
  return uplift / tension > compression / capacity
}

function governingOf(
  prepared: PreparedColumn,
  section: Section,
  screening: Screening,
  { governing, tensionClause }: StandardParts,
): Governing {
  const { bent, utilisation } = screening
  if (bent && bent.utilisation >= utilisation) {
    return { check: 'interaction', axis: '', clause: 'H1', combination: bent.demand.combination.name }
  }
  const { compressionBy, upliftBy } = demandOf(prepared, section.mass)
  return isInUplift(screening)
    ? { check: 'tension', axis: '', clause: tensionClause, combination: upliftBy.name }
    : { ...governing, combination: compressionBy.name }
}

function requiredCheck(prepared: PreparedColumn, section: Section, screening: Screening): Check {
  const { compressionBy, uplift, upliftBy } = demandOf(prepared, section.mass)
  const inUplift = isInUplift(screening)
  const demand = inUplift ? screening.uplift : screening.compression
  const capacity = inUplift ? screening.tension : screening.capacity
  return {
    clause: prepared.request.required ? 'as given' : prepared.terms.combinations,
    title: 'Required and available strength',
    ...{ demand, capacity, unit: 'N', utilisation: demand / capacity },
    steps: [
      ...requiredSteps(prepared, section.mass, compressionBy, 'Pr'),
      ...(uplift > 0 ? requiredSteps(prepared, section.mass, upliftBy, 'Tr').slice(-1) : []),
    ],
    notes: [],
  }
}

function commonValues(
  section: Section,
  { Fy, Fu }: Steel,
  { capacity, tension, compression, uplift }: Screening,
  lengths: ColumnLengths,
): Record<string, number> {
  return {
    area: section.area,
    yield: Fy,
    ultimate: Fu,
    slendernessStrong: slenderness(lengths.strong.used, section.rx),
    slendernessWeak: slenderness(lengths.weak.used, section.ry),
    available: capacity,
    required: compression,
    tensionAvailable: tension,
    uplift,
  }
}
