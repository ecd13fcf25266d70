import type { EndCondition } from '../stability/column.ts'
import { circle, line, polyline, type Mark, type Point } from './scene.ts'

const WALL = 15
const HATCH = 5

/** A line that does not move, hatched on the side away from the column: `down` is 1 below the line, -1 above it. */
function ground([x, y]: Point, down: 1 | -1, half = WALL): Mark[] {
  const strokes: Mark[] = []
  for (let at = -half + HATCH; at <= half; at += HATCH) {
    strokes.push(line('hatch', [x + at, y], [x + at - HATCH, y + down * HATCH]))
  }
  return [line('support', [x - half, y], [x + half, y]), ...strokes]
}

/** A wall that stands, hatched on the side away from the column: `side` is 1 on the right, -1 on the left. */
function wall([x, y]: Point, side: 1 | -1, half: number): Mark[] {
  const strokes: Mark[] = []
  for (let at = -half; at < half; at += HATCH) {
    strokes.push(line('hatch', [x, y + at + HATCH], [x + side * HATCH, y + at]))
  }
  return [line('support', [x, y - half], [x, y + half]), ...strokes]
}

/** A stiff plate that rolls along what does not move: `down` is 1 at the foot, -1 at the head. */
function rollingPlate([x, y]: Point, down: 1 | -1, half: number): Mark[] {
  const rollers = [-8, 0, 8].map((at) => circle('support', [x + at, y + down * 3.5], 3))
  return [line('support', [x - half, y], [x + half, y]), ...rollers, ...ground([x, y + down * 7], down, half)]
}

/**
 * The textbook sign of a column's foot. Pinned: a triangle on hatched ground. Fixed: the shaft in hatched ground.
 * Guided: a stiff plate on rollers, free to move sideways and not to turn. Free: no sign.
 */
export function footSign(condition: EndCondition, [x, y]: Point, halfShaft: number): Mark[] {
  switch (condition) {
    case 'pinned':
      return [
        polyline(
          'support',
          [
            [x, y],
            [x - 9, y + 14],
            [x + 9, y + 14],
          ],
          true,
        ),
        ...ground([x, y + 14], 1),
      ]
    case 'fixed':
      return ground([x, y], 1, Math.max(WALL + 3, halfShaft + 10))
    case 'guided':
      return rollingPlate([x, y], 1, Math.max(WALL, halfShaft + 4))
    case 'free':
      return []
  }
}

/**
 * The sign of a column's head, which must let the load come down: held sideways by a pin that rides on a wall
 * (pinned), held in a sleeve (fixed), or a stiff plate that rolls under a beam (guided).
 */
export function headSign(condition: EndCondition, [x, y]: Point, halfShaft: number): Mark[] {
  const face = x + halfShaft
  switch (condition) {
    case 'pinned':
      return [
        polyline(
          'support',
          [
            [face, y],
            [face + 10, y - 7],
            [face + 10, y + 7],
          ],
          true,
        ),
        circle('support', [face + 12.5, y - 4], 2.5),
        circle('support', [face + 12.5, y + 4], 2.5),
        ...wall([face + 15, y], 1, 10),
      ]
    case 'fixed':
      return [...wall([face + 1.5, y + 8], 1, 10), ...wall([x - halfShaft - 1.5, y + 8], -1, 10)]
    case 'guided':
      return rollingPlate([x, y], -1, Math.max(WALL, halfShaft + 4))
    case 'free':
      return []
  }
}
