import type { Issue } from '../units/refusal.ts'
import type { Axis, Column } from './column.ts'
import { braceHeightsOf } from './column-lengths.ts'
import { isMechanism } from './restraint.ts'
import { twistStops } from './torsion.ts'

/** mm. */
export const MAX_HEIGHT = 30_000
export const MIN_SPACING = 50

/** Everything in the geometry of a column that cannot be taken, each with its field and what would be right; none: it can. */
export function validateColumn(column: Column): Issue[] {
  const height = heightIssues(column)
  if (height.length > 0) return height
  const braces = braceIssues(column)
  if (braces.length > 0) return braces
  return [...mechanismIssues(column, 'strong'), ...mechanismIssues(column, 'weak'), ...twistIssues(column)]
}

function heightIssues({ height }: Column): Issue[] {
  if (Number.isFinite(height) && height > 0 && height <= MAX_HEIGHT) return []
  return [{ path: 'height', message: 'a height is more than 0 and at most 30 000 mm (98 ft)' }]
}

function braceIssues(column: Column): Issue[] {
  return column.braces.flatMap((brace, index): Issue[] => {
    const path = `braces.${index}.height`
    const highest = column.height - MIN_SPACING
    if (!(brace.height >= MIN_SPACING && brace.height <= highest)) {
      const message =
        highest < MIN_SPACING
          ? `a column of ${column.height} mm is too short for a brace: each is at least ${MIN_SPACING} mm from both ends`
          : `a brace of this column is between ${MIN_SPACING} and ${highest} mm above the base (${MIN_SPACING} mm from an end at least)`
      return [{ path, message }]
    }
    const offset = brace.offset
    if (offset !== undefined && !Number.isFinite(offset)) {
      return [{ path: `braces.${index}.offset`, message: 'an offset is a distance from the centre in mm' }]
    }
    const near = column.braces.findIndex(
      (other, at) =>
        at < index &&
        Math.abs(other.height - brace.height) < MIN_SPACING &&
        (other.holds === brace.holds || other.holds === 'both' || brace.holds === 'both'),
    )
    if (near < 0) return []
    return [
      {
        path,
        message: `braces of one axis are at least ${MIN_SPACING} mm apart; this one is nearer to brace ${near + 1}`,
      },
    ]
  })
}

function mechanismIssues(column: Column, axis: Axis): Issue[] {
  const ends = column.ends[axis]
  if (!isMechanism(column.height, ends, braceHeightsOf(column, axis))) return []
  const end = ends.top !== 'free' && ends.bottom === 'free' ? 'bottom' : 'top'
  return [
    {
      path: `ends.${axis}.${end}`,
      message:
        `with ${ends.bottom} base, ${ends.top} top and these braces the column can move about its ${axis} axis without bending; ` +
        'hold it sideways at two points, or at one with an end that cannot turn',
    },
  ]
}

function twistIssues(column: Column): Issue[] {
  if (twistStops(column).length > 0) return []
  return [
    {
      path: 'braces',
      message: 'with both ends free nothing stops twist; at least one brace has to (stopsTwist)',
    },
  ]
}
