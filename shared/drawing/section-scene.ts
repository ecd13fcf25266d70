import type { UnitSystem } from '../units/step.ts'
import { lyingDimension, standingDimension } from './dimension.ts'
import { shapeLabel } from './labels.ts'
import { framePlan } from './plan-frame.ts'
import { line, words, type Mark, type Scene } from './scene.ts'

export type Outline = readonly (readonly (readonly [number, number])[])[]

export const SECTION_SHEET = 220
const LEFT = 40
const RIGHT = 22
const TOP = 26
const BOTTOM = 34
/** How far the axes run past the shape. */
const PAST = 10

/** A section to scale with depth, width and both axes; outline in mm from the centroid, y along the depth. */
export function sectionScene(
  outline: Outline,
  depth: number,
  width: number,
  system: UnitSystem,
  sheet: number = SECTION_SHEET,
): Scene {
  const frame = framePlan(
    { across: width, down: depth },
    { left: LEFT, top: TOP, width: sheet - LEFT - RIGHT, height: sheet - TOP - BOTTOM },
  )
  const { left, right, top, bottom, centre } = frame
  const marks: Mark[] = [
    { kind: 'rings', meaning: 'outline', rings: outline.map((ring) => ring.map(frame.place)) },
    line('axis', [left - PAST, centre[1]], [right + PAST, centre[1]]),
    line('axis', [centre[0], top - PAST], [centre[0], bottom + PAST]),
    words('axis-letter', [right + PAST + 5, centre[1]], 'x', { size: 11 }),
    words('axis-letter', [centre[0], top - PAST - 7], 'y', { anchor: 'middle', size: 11 }),
    ...standingDimension(left - 18, bottom, top, shapeLabel(depth, system)),
    line('witness', [left - 3, top], [left - 23, top]),
    line('witness', [left - 3, bottom], [left - 23, bottom]),
    ...lyingDimension(bottom + 28, left, right, shapeLabel(width, system)),
    line('witness', [left, bottom + 3], [left, bottom + 33]),
    line('witness', [right, bottom + 3], [right, bottom + 33]),
  ]
  return { width: sheet, height: bottom + 38, marks }
}
