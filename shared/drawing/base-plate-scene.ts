import type { UnitSystem } from '../units/step.ts'
import { lyingDimension, standingDimension } from './dimension.ts'
import { detailLabel } from './labels.ts'
import { framePlan, type PlanFrame } from './plan-frame.ts'
import { circle, line, polyline, words, type Mark, type Scene } from './scene.ts'
import type { Outline } from './section-scene.ts'

export interface BasePlateDrawing {
  /** mm; the length runs along the section's depth. */
  plate: { length: number; width: number; thickness: number }
  holes: { diameter: number }
  /** Rod centres from the plate's centre, mm: along the length, along the width. */
  positions: readonly (readonly [number, number])[]
  outline: Outline
  system: UnitSystem
  sheet?: number | undefined
}

export const PLATE_SHEET = 260
const LEFT = 58
const TOP = 14
const RIGHT = 14
const BOTTOM = 76

/** A base plate in plan: plate, shaft, holes with their centres, and the dimensions to make it. */
export function basePlateScene(drawing: BasePlateDrawing): Scene {
  const { plate, holes, positions, outline, sheet = PLATE_SHEET } = drawing
  const frame = framePlan(
    { across: plate.width, down: plate.length },
    { left: LEFT, top: TOP, width: sheet - LEFT - RIGHT, height: sheet - TOP - BOTTOM },
  )
  const { left, right, top, bottom } = frame
  const radius = (holes.diameter / 2) * frame.scale
  const marks: Mark[] = [
    polyline(
      'plate',
      [
        [left, bottom],
        [left, top],
        [right, top],
        [right, bottom],
      ],
      true,
    ),
    { kind: 'rings', meaning: 'outline', rings: outline.map((ring) => ring.map(frame.place)) },
    ...positions.flatMap(([along, across]) => hole(frame.place([across, along]), radius)),
    ...spacings(drawing, frame),
    ...standingDimension(left - 40, bottom, top, detailLabel(plate.length, drawing.system)),
    ...lyingDimension(bottom + 48, left, right, detailLabel(plate.width, drawing.system)),
    ...[top, bottom].map((y) => line('witness', [left - 3, y], [left - 45, y])),
    ...[left, right].map((x) => line('witness', [x, bottom + 3], [x, bottom + 53])),
  ]
  const thick = `plate ${detailLabel(plate.thickness, drawing.system)}`
  const bored = `${positions.length} holes Ø ${detailLabel(holes.diameter, drawing.system)}`
  const note = positions.length === 0 ? thick : `${thick} · ${bored}`
  marks.push(words('note', [(left + right) / 2, bottom + 67], note, { anchor: 'middle' }))
  return { width: sheet, height: bottom + BOTTOM, marks }
}

function hole([x, y]: [number, number], radius: number): Mark[] {
  const arm = radius + 4
  return [
    circle('hole', [x, y], radius),
    line('centre', [x - arm, y], [x + arm, y]),
    line('centre', [x, y - arm], [x, y + arm]),
  ]
}

/** Each row and column of holes once, in order, as lines of one chain of dimensions. */
function distinct(values: number[]): number[] {
  const sorted = values.toSorted((a, b) => a - b)
  return sorted.filter((value, index) => index === 0 || value - (sorted[index - 1] ?? value) > 0.5)
}

function spacings({ positions, system }: BasePlateDrawing, frame: PlanFrame): Mark[] {
  const along = distinct(positions.map(([value]) => value))
  const across = distinct(positions.map(([, value]) => value))
  const { left, bottom } = frame
  const marks: Mark[] = []
  along.forEach((value, index) => {
    const y = frame.place([0, value])[1]
    marks.push(line('witness', [frame.place([across[0] ?? 0, 0])[0] - 8, y], [left - 22, y]))
    const next = along[index + 1]
    if (next === undefined) return
    marks.push(
      ...standingDimension(left - 17, y, frame.place([0, next])[1], detailLabel(next - value, system), 10),
    )
  })
  across.forEach((value, index) => {
    const x = frame.place([value, 0])[0]
    marks.push(line('witness', [x, frame.place([0, along[0] ?? 0])[1] + 8], [x, bottom + 29]))
    const next = across[index + 1]
    if (next === undefined) return
    marks.push(
      ...lyingDimension(bottom + 24, x, frame.place([next, 0])[0], detailLabel(next - value, system), 10),
    )
  })
  return marks
}
