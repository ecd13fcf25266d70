import { solveColumn, type ColumnSolution } from '../stability/column-lengths.ts'
import type { LengthSolution } from '../stability/effective-length.ts'
import type { Column } from '../stability/column.ts'
import { Refusal } from '../units/refusal.ts'
import { combine, extremes, type Combination, type Extremes } from './asce7/combine.ts'
import { completeLoads } from './asce7/loads.ts'
import { selfWeight } from './asce7/self-weight.ts'
import type { AiscTerms, ColumnRequest, LengthsGiven, RequiredStrength } from './column-request.ts'
import { columnOf, requestIssues, termsOf } from './validate-request.ts'

/** What of a request is the same for every shape: solved once, used for the whole catalogue. */
export interface PreparedColumn {
  request: ColumnRequest
  terms: AiscTerms
  /** Undefined where effective lengths are given outright. */
  column: Column | undefined
  solution: ColumnSolution
  /** Offsets of weak-axis braces that do not stop twist, mm, each once. */
  braceOffsets: number[]
  combinations: [Combination, ...Combination[]]
  /** Height whose weight is added to the dead load, mm; 0: none. */
  weighedHeight: number
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

function combinationsOf(request: ColumnRequest, terms: AiscTerms): [Combination, ...Combination[]] {
  if (request.required) return asRequired(request.required)
  const cases = completeLoads(request.loads ?? {})
  const [first, ...rest] = combine(cases, terms.combinations, terms.method, terms.liveFactor)
  if (!first) throw new Error('a rule of combinations has no combination')
  return [first, ...rest]
}

/** Checks a request and solves what no shape changes. Refuses what cannot be taken, naming every field. */
export function prepareColumn(request: ColumnRequest): PreparedColumn {
  const issues = requestIssues(request)
  const terms = termsOf(request)
  const column = columnOf(request)
  const { lengths } = request
  if (issues.length > 0 || Array.isArray(terms)) throw new Refusal(issues)
  const solution = lengths ? givenSolution(lengths) : column && solveColumn(column)
  if (!solution) throw new Refusal([{ path: 'height', message: 'give the height of the column in mm' }])
  const weighed = request.selfWeight !== false && !request.required
  return {
    request,
    terms,
    column: lengths ? undefined : column,
    solution,
    braceOffsets: offsetsOf(request),
    combinations: combinationsOf(request, terms),
    weighedHeight: weighed ? (request.height ?? 0) : 0,
  }
}

/** Governing compression and worst uplift of a column of a shape of this mass, kg/m. */
export function demandOf(prepared: PreparedColumn, massPerMetre: number): Extremes {
  return extremes(prepared.combinations, selfWeight(massPerMetre, prepared.weighedHeight))
}
