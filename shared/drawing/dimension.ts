import { line, words, type Mark, type Point } from './scene.ts'

/** Half the length of the slanted tick that ends a dimension line. */
const TICK = 3
/** How far a dimension line runs past its ticks. */
const PAST = 3

function tick([x, y]: Point): Mark {
  return line('dimension', [x - TICK, y + TICK], [x + TICK, y - TICK])
}

/** A dimension line that stands, without its text. `from` and `to` are heights on the sheet. */
export function standingLine(x: number, from: number, to: number): Mark[] {
  const [low, high] = [Math.max(from, to), Math.min(from, to)]
  return [line('dimension', [x, low + PAST], [x, high - PAST]), tick([x, low]), tick([x, high])]
}

/** A standing dimension with its text on the left, read from below. */
export function standingDimension(x: number, from: number, to: number, text: string, size = 11): Mark[] {
  const middle = (from + to) / 2
  return [
    ...standingLine(x, from, to),
    words('value', [x - size * 0.8, middle], text, { anchor: 'middle', turn: -90, size }),
  ]
}

/** A lying dimension with its text above the line. */
export function lyingDimension(y: number, from: number, to: number, text: string, size = 11): Mark[] {
  const [left, right] = [Math.min(from, to), Math.max(from, to)]
  return [
    line('dimension', [left - PAST, y], [right + PAST, y]),
    tick([left, y]),
    tick([right, y]),
    words('value', [(left + right) / 2, y - size * 0.8], text, { anchor: 'middle', size }),
  ]
}
