/*
 * A drawing as plain primitives with a meaning each, so that the page and the paper render the same one. Units are
 * those of the sheet (a CSS pixel on screen, a point on paper); y points down.
 */
export type Point = [number, number]

/** What a mark means; the renderers decide how that looks. */
export type Meaning =
  | 'axis'
  | 'shaft'
  | 'outline'
  | 'break'
  | 'support'
  | 'hatch'
  | 'brace'
  | 'load'
  | 'uplift'
  | 'buckled'
  | 'dimension'
  | 'witness'
  | 'plumb'
  | 'bob'
  | 'plate'
  | 'hole'
  | 'centre'

export type TextMeaning = 'value' | 'note' | 'title' | 'axis-letter'

export interface PolylineMark {
  kind: 'polyline'
  meaning: Meaning
  points: Point[]
  /** Joined back to its first point. */
  closed: boolean
}

export interface CircleMark {
  kind: 'circle'
  meaning: Meaning
  centre: Point
  radius: number
}

/** Several closed rings as one surface: the second and later ones are holes. */
export interface RingsMark {
  kind: 'rings'
  meaning: Meaning
  rings: Point[][]
}

export interface TextMark {
  kind: 'text'
  meaning: TextMeaning
  /** The point that the anchor and the middle of the letters sit on. */
  at: Point
  text: string
  anchor: 'start' | 'middle' | 'end'
  size: number
  /** Degrees, clockwise; -90 reads from below. */
  turn: number
}

export type Mark = PolylineMark | CircleMark | RingsMark | TextMark

export interface Scene {
  width: number
  height: number
  marks: Mark[]
}

export function line(meaning: Meaning, from: Point, to: Point): PolylineMark {
  return { kind: 'polyline', meaning, points: [from, to], closed: false }
}

export function polyline(meaning: Meaning, points: Point[], closed = false): PolylineMark {
  return { kind: 'polyline', meaning, points, closed }
}

export function circle(meaning: Meaning, centre: Point, radius: number): CircleMark {
  return { kind: 'circle', meaning, centre, radius }
}

export function words(
  meaning: TextMeaning,
  at: Point,
  text: string,
  options: { anchor?: TextMark['anchor']; size?: number; turn?: number } = {},
): TextMark {
  const { anchor = 'start', size = 11, turn = 0 } = options
  return { kind: 'text', meaning, at, text, anchor, size, turn }
}
