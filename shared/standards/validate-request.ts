import type { Column } from '../stability/column.ts'
import { MAX_HEIGHT, validateColumn } from '../stability/validate-column.ts'
import type { Issue } from '../units/refusal.ts'
import { completeLoads, LARGEST_LOAD, loadIssues } from './asce7/loads.ts'
import type { AiscTerms, ColumnRequest, EnTerms, RequiredStrength, Terms } from './column-request.ts'

/** Largest effective length that can be given outright, mm: twice the tallest column. */
const MAX_LENGTH = 2 * MAX_HEIGHT
/** N·mm and mm: beyond these it is no column in simple framing. */
const LARGEST_MOMENT = 1e11
const LARGEST_OFFSET = 2000
const NOT_OFFERED = 'not yet offered; give 0 or ask the shop'

/** The standard's terms with their defaults, or what of them does not go together. */
export function termsOf(request: ColumnRequest): Terms | Issue[] {
  return request.standard === 'EN 1993-1-1' ? enTermsOf(request) : aiscTermsOf(request)
}

function enTermsOf({ combinations = 'EN 1990 6.10', liveCategory = 'B' }: ColumnRequest): EnTerms | Issue[] {
  if (combinations === 'ASCE 7-22' || combinations === 'ASCE 7-16') {
    const message = 'EN 1993-1-1 goes with the combinations of EN 1990'
    return [{ path: 'combinations', message }]
  }
  return { standard: 'EN 1993-1-1', combinations, liveCategory }
}

function aiscTermsOf(request: ColumnRequest): AiscTerms | Issue[] {
  const { method = 'LRFD', liveFactor = 0.5 } = request
  const standard = request.standard === 'AISC 360-16' ? 'AISC 360-16' : 'AISC 360-22'
  const combinations = request.combinations ?? (standard === 'AISC 360-22' ? 'ASCE 7-22' : 'ASCE 7-16')
  if (combinations === 'EN 1990 6.10' || combinations === 'EN 1990 6.10ab') {
    const message = `${standard} goes with the combinations of ASCE 7-22 or ASCE 7-16`
    return [{ path: 'combinations', message }]
  }
  if (!(liveFactor >= 0.5 && liveFactor <= 1)) {
    const message = 'the live load factor f1 is 0.5, or 1.0 for garages, assembly and more than 100 psf'
    return [{ path: 'liveFactor', message }]
  }
  return { standard, method, combinations, liveFactor }
}

/** What the checks of EN 1993-1-1 have no rule for here: refused with its reason, never left out. */
function europeanIssues(request: ColumnRequest): Issue[] {
  if (request.standard !== 'EN 1993-1-1') return []
  const issues: Issue[] = []
  const say = (path: string, message: string) => issues.push({ path, message })
  for (const axis of ['strong', 'weak'] as const) {
    const message = `not offered by EN 1993-1-1 here: its interaction check is still wanting; give 0, or use AISC 360`
    if (request.offset?.[axis]) say(`offset.${axis}`, `a load off the axis is ${message}`)
    const name = axis === 'strong' ? 'momentStrong' : 'momentWeak'
    if (request.required?.[name]) say(`required.${name}`, `an end moment is ${message}`)
  }
  const { rain, earthquake } = request.loads ?? {}
  if (rain) say('loads.rain', 'EN 1990 has no action of rain: give it with the snow')
  for (const name of ['pushes', 'lifts', 'vertical'] as const) {
    if (earthquake?.[name])
      say(`loads.earthquake.${name}`, 'seismic combinations of EN 1990 are not offered yet')
  }
  request.braces?.forEach(({ offset, stopsTwist }, index) => {
    if (offset && !stopsTwist) {
      say(`braces.${index}.offset`, 'EN 1993-1-1 has no rule for it here: stop twist at the brace, or give 0')
    }
  })
  return issues
}

/** The geometry that is asked, when ends and height are. */
export function columnOf(request: ColumnRequest): Column | undefined {
  const { height, ends, braces = [], endFixity = 'recommended' } = request
  if (height === undefined || ends === undefined) return undefined
  return { height, ends, braces: [...braces], endFixity }
}

function lengthIssues(request: ColumnRequest): Issue[] {
  const { lengths, ends, braces = [], height } = request
  if (!lengths) {
    if (height === undefined) return [{ path: 'height', message: 'give the height of the column in mm' }]
    if (!ends) return [{ path: 'ends', message: 'give both ends about both axes, or effective lengths' }]
    const column = columnOf(request)
    return column ? [...validateColumn(column), ...offsetBraceIssues(request)] : []
  }
  const issues: Issue[] = []
  if (ends || braces.length > 0) {
    const message = 'effective lengths are given in place of ends and braces; leave one of the two out'
    issues.push({ path: 'lengths', message })
  }
  for (const axis of ['strong', 'weak', 'torsion'] as const) {
    if (lengths[axis] > 0 && lengths[axis] <= MAX_LENGTH) continue
    const message = 'an effective length is more than 0 and at most 60 000 mm (197 ft)'
    issues.push({ path: `lengths.${axis}`, message })
  }
  if (!Number.isFinite(lengths.braceOffset ?? 0)) {
    issues.push({ path: 'lengths.braceOffset', message: 'an offset is a distance from the centre in mm' })
  }
  if (height !== undefined && !(height > 0 && height <= MAX_HEIGHT)) {
    issues.push({ path: 'height', message: 'a height is more than 0 and at most 30 000 mm (98 ft)' })
  }
  return [...issues, ...offsetBraceIssues(request)]
}

/** Braces off the centre that do not stop twist: AISC 360-22 has a rule for weak-axis ones, E4(d); 360-16 has none. */
function offsetBraceIssues(request: ColumnRequest): Issue[] {
  const older = request.standard === 'AISC 360-16'
  const noRule = 'AISC 360-16 has no rule for it: use AISC 360-22, stop twist at the brace, or give 0'
  const issues = (request.braces ?? []).flatMap((brace, index): Issue[] => {
    if (brace.stopsTwist || !brace.offset) return []
    const path = `braces.${index}.offset`
    if (brace.holds === 'strong') {
      return [
        { path, message: `an offset brace of the strong axis that does not stop twist is ${NOT_OFFERED}` },
      ]
    }
    return older ? [{ path, message: `an offset brace that does not stop twist: ${noRule}` }] : []
  })
  if (older && request.lengths?.braceOffset) {
    issues.push({ path: 'lengths.braceOffset', message: `braces off the centre: ${noRule}` })
  }
  return issues
}

function requiredIssues(required: RequiredStrength): Issue[] {
  const issues: Issue[] = []
  const { axial } = required
  if (!Number.isFinite(axial) || Math.abs(axial) > LARGEST_LOAD) {
    const message = 'a required strength is a number of newtons, at most 1 000 000 kN either way'
    issues.push({ path: 'required.axial', message })
  } else if (axial === 0) {
    const message = 'give a required strength other than 0: compression positive, uplift negative'
    issues.push({ path: 'required.axial', message })
  }
  for (const name of ['momentStrong', 'momentWeak'] as const) {
    const moment = required[name] ?? 0
    if (Number.isFinite(moment) && Math.abs(moment) <= LARGEST_MOMENT) continue
    const message = 'an end moment is a number of N·mm, at most 100 000 kN·m either way'
    issues.push({ path: `required.${name}`, message })
  }
  for (const name of ['momentRatioStrong', 'momentRatioWeak'] as const) {
    const ratio = required[name] ?? 0
    if (ratio >= -1 && ratio <= 1) continue
    const message = 'M1/M2 is from −1 (single curvature) to 1 (reverse curvature)'
    issues.push({ path: `required.${name}`, message })
  }
  return issues
}

function demandIssues({ loads, required, offset }: ColumnRequest): Issue[] {
  const issues: Issue[] = []
  for (const axis of ['strong', 'weak'] as const) {
    if (Math.abs(offset?.[axis] ?? 0) <= LARGEST_OFFSET) continue
    issues.push({ path: `offset.${axis}`, message: 'an offset is at most 2 000 mm either way' })
  }
  if (loads && required) {
    const message = 'give loads by case or a required strength, not both'
    return [...issues, { path: 'required', message }]
  }
  if (required) return [...issues, ...requiredIssues(required)]
  if (loads) return [...issues, ...loadIssues(completeLoads(loads))]
  return [...issues, { path: 'loads', message: 'give the loads by case, or a required strength' }]
}

/** Everything in a request that cannot be taken, each with its field and what would be right; none: it can. */
export function requestIssues(request: ColumnRequest): Issue[] {
  const terms = termsOf(request)
  return [
    ...(Array.isArray(terms) ? terms : []),
    ...lengthIssues(request),
    ...demandIssues(request),
    ...europeanIssues(request),
  ]
}
