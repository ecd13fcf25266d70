import { solveColumn, type ColumnSolution } from '../stability/column-lengths.ts'
import type { LengthSolution } from '../stability/effective-length.ts'
import type { Column } from '../stability/column.ts'
import { Refusal } from '../units/refusal.ts'
import { combine, extremes, valueWith, type Combination, type Extremes } from './asce7/combine.ts'
import { completeLoads } from './asce7/loads.ts'
import { selfWeight } from './asce7/self-weight.ts'
import type { ColumnRequest, LengthsGiven, RequiredStrength, Terms } from './column-request.ts'
import { combineEn } from './en1990/combinations.ts'
import { columnOf, requestIssues, termsOf } from './validate-request.ts'

/** What of a request is the same for every shape: solved once, used for the whole catalogue. */
export interface PreparedColumn {
  request: ColumnRequest
  terms: Terms
  /** Undefined where effective lengths are given outright. */
  column: Column | undefined
  solution: ColumnSolution
  /** Offsets of weak-axis braces that do not stop twist, mm, each once. */
  braceOffsets: number[]
  combinations: [Combination, ...Combination[]]
  /** Those of them that can press or lift the most, whatever the column itself weighs. */
  extreme: [Combination, ...Combination[]]
  /** How the load bends the column; undefined where it acts along the axis. */
  bending: Bending | undefined
  /** Height whose weight is added to the dead load, mm; 0: none. */
  weighedHeight: number
}

/** Moments of a load off the axis, and end moments as given: about each axis, mm and N·mm. */
export interface Bending {
  offset: { strong: number; weak: number }
  moment: { strong: number; weak: number }
  /** M1/M2, positive in reverse curvature. */
  ratio: { strong: number; weak: number }
}

/**
 * M1/M2 that was not given: 0 where the far end is held and unmoved, −1 (the whole height bent alike) where an end can
 * move sideways.
 */
function usualRatio({ ends }: ColumnRequest, axis: 'strong' | 'weak'): number {
  const about = ends?.[axis]
  const sways = about && [about.top, about.bottom].some((end) => end === 'free' || end === 'guided')
  return sways ? -1 : 0
}

/** Undefined where nothing bends. */
function bendingOf(request: ColumnRequest): Bending | undefined {
  const { offset, required } = request
  const bending: Bending = {
    offset: { strong: Math.abs(offset?.strong ?? 0), weak: Math.abs(offset?.weak ?? 0) },
    moment: { strong: Math.abs(required?.momentStrong ?? 0), weak: Math.abs(required?.momentWeak ?? 0) },
    ratio: {
      strong: required?.momentRatioStrong ?? usualRatio(request, 'strong'),
      weak: required?.momentRatioWeak ?? usualRatio(request, 'weak'),
    },
  }
  const all = [...Object.values(bending.offset), ...Object.values(bending.moment)]
  return all.some((one) => one > 0) ? bending : undefined
}

function given(length: number): LengthSolution {
  return {
    segment: length,
    eigenvalue: length,
    used: length,
    governedBy: 'segment',
    segments: [],
    shape: [],
  }
}

function givenSolution({ strong, weak, torsion }: LengthsGiven): ColumnSolution {
  return { strong: given(strong), weak: given(weak), torsion: { used: torsion, segments: [] } }
}

function offsetsOf({ braces = [], lengths }: ColumnRequest): number[] {
  const offsets = braces
    .filter((brace) => brace.holds !== 'strong' && !brace.stopsTwist)
    .map((brace) => brace.offset ?? 0)
  const all = [...offsets, lengths?.braceOffset ?? 0].map((offset) => Math.abs(offset))
  return [...new Set(all)].filter((offset) => offset > 0)
}

/** A required strength stands as a combination of its own, with nothing to add to it. */
function asRequired({ axial }: RequiredStrength): [Combination] {
  return [{ name: 'as given', factors: {}, loads: {}, value: axial }]
}

function combinationsOf(request: ColumnRequest, terms: Terms): [Combination, ...Combination[]] {
  if (request.required) return asRequired(request.required)
  const cases = completeLoads(request.loads ?? {})
  const [first, ...rest] =
    terms.standard === 'EN 1993-1-1'
      ? combineEn(cases, terms.combinations, terms.liveCategory)
      : combine(cases, terms.combinations, terms.method, terms.liveFactor)
  if (!first) throw new Error('a rule of combinations has no combination')
  return [first, ...rest]
}

/**
 * The column's weight adds to each combination by its factor of dead load: among those with one factor the largest and
 * the smallest stay so. The order is kept, so that ties fall as they would among all.
 */
function extremeOf(combinations: readonly [Combination, ...Combination[]]): [Combination, ...Combination[]] {
  const kept = new Set<Combination>()
  for (const factor of new Set(combinations.map(({ factors }) => factors.D))) {
    const group = combinations.filter(({ factors }) => factors.D === factor)
    kept.add(group.reduce((most, one) => (one.value > most.value ? one : most)))
    kept.add(group.reduce((least, one) => (one.value < least.value ? one : least)))
  }
  const [first = combinations[0], ...rest] = combinations.filter((one) => kept.has(one))
  return [first, ...rest]
}

/**
 * Checks a request and solves what no shape changes. Refuses what cannot be taken, naming every field. `solve`: how
 * lengths are found, where many columns of one form are asked for.
 */
export function prepareColumn(
  request: ColumnRequest,
  solve: (column: Column) => ColumnSolution = solveColumn,
): PreparedColumn {
  const issues = requestIssues(request)
  const terms = termsOf(request)
  const column = columnOf(request)
  const { lengths } = request
  if (issues.length > 0 || Array.isArray(terms)) throw new Refusal(issues)
  const solution = lengths ? givenSolution(lengths) : column && solve(column)
  if (!solution) throw new Refusal([{ path: 'height', message: 'give the height of the column in mm' }])
  const combinations = combinationsOf(request, terms)
  const weighed = request.selfWeight !== false && !request.required
  return {
    request,
    terms,
    column: lengths ? undefined : column,
    solution,
    braceOffsets: offsetsOf(request),
    combinations,
    extreme: extremeOf(combinations),
    bending: bendingOf(request),
    weighedHeight: weighed ? (request.height ?? 0) : 0,
  }
}

/** Governing compression and worst uplift of a column of a shape of this mass, kg/m. */
export function demandOf(prepared: PreparedColumn, massPerMetre: number): Extremes {
  return extremes(prepared.extreme, selfWeight(massPerMetre, prepared.weighedHeight))
}

/** What one combination asks of a column: N, compression positive; first-order moments, N·mm. */
export interface Demand {
  combination: Combination
  axial: number
  momentStrong: number
  momentWeak: number
}

/** Every combination with its moments: the load off the axis bends, the column's own weight does not. */
export function demandsOf(
  { combinations, weighedHeight }: PreparedColumn,
  { offset, moment }: Bending,
  massPerMetre: number,
): Demand[] {
  const weight = selfWeight(massPerMetre, weighedHeight)
  return combinations.map((combination) => {
    const applied = Math.abs(combination.value)
    return {
      combination,
      axial: valueWith(combination, weight),
      momentStrong: applied * offset.strong + moment.strong,
      momentWeak: applied * offset.weak + moment.weak,
    }
  })
}
