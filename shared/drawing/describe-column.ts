import type { Axis, Brace, EndCondition, EffectiveLength } from '../stability/column.ts'
import type { UnitSystem } from '../units/step.ts'
import type { BasePlateDrawing } from './base-plate-scene.ts'
import type { ColumnDrawing } from './column-drawing.ts'
import { computedLengthLabel, detailLabel, forceLabel, heightLabel, shapeLabel } from './labels.ts'

const HELD: Record<EndCondition, string> = {
  pinned: 'pinned',
  fixed: 'fixed',
  guided: 'guided (it may move sideways but not turn)',
  free: 'free',
}
const AXES: Record<Axis | 'both', string> = {
  strong: 'the strong axis only',
  weak: 'the weak axis only',
  both: 'both axes',
}

/** The drawing in words: says what `columnScene` draws, for those who do not see it. */
export function describeColumn(drawing: ColumnDrawing): string {
  const { height, ends, braces, lengths, compression, uplift, system } = drawing
  const sentences = [`Column ${heightLabel(height, system)} high, seen about both axes.`]
  if (sameEnds(ends)) sentences.push(`${endsInWords(ends.strong)} about both axes.`)
  else sentences.push(`Strong axis: ${lower(ends.strong)}. Weak axis: ${lower(ends.weak)}.`)
  if (braces.length === 0) sentences.push('No braces between the ends.')
  braces.forEach((brace, index) => sentences.push(braceInWords(brace, index, system)))
  if (compression) sentences.push(`It carries ${forceLabel(compression, system)} of compression.`)
  if (uplift) sentences.push(`It is lifted by ${forceLabel(uplift, system)}.`)
  if (lengths) {
    sentences.push(
      lengthInWords('strong', lengths.strong, system),
      lengthInWords('weak', lengths.weak, system),
    )
  }
  return sentences.join(' ')
}

/** One brace as a sentence: "Brace 1 at 3.20 m holds the weak axis only; twist is free." */
export function braceInWords(brace: Brace, index: number, system: UnitSystem): string {
  return `Brace ${index + 1} at ${heightLabel(brace.height, system)} holds ${braceHolds(brace)}.`
}

/** What a brace holds and what it leaves free: "the weak axis only; twist is free". */
export function braceHolds({ holds, stopsTwist }: Pick<Brace, 'holds' | 'stopsTwist'>): string {
  return `${AXES[holds]}; ${stopsTwist ? 'it stops twist' : 'twist is free'}`
}

export function describeSection(name: string, depth: number, width: number, system: UnitSystem): string {
  const size = `${shapeLabel(depth, system)} deep and ${shapeLabel(width, system)} wide`
  return `Section ${name}, ${size}, with its strong axis x lying and its weak axis y standing.`
}

export function describeBasePlate({ plate, holes, positions, system }: BasePlateDrawing): string {
  const label = (mm: number) => detailLabel(mm, system)
  const places = positions.map(([along, across]) => `${label(along)} along and ${label(across)} across`)
  const holesText =
    places.length === 0
      ? 'It has no holes.'
      : `It has ${places.length} holes of diameter ${label(holes.diameter)}, from the centre: ${places.join('; ')}.`
  return `Base plate in plan, ${label(plate.length)} along the depth and ${label(plate.width)} across. ${holesText}`
}

function sameEnds({ strong, weak }: ColumnDrawing['ends']): boolean {
  return strong.bottom === weak.bottom && strong.top === weak.top
}

function lower(ends: ColumnDrawing['ends'][Axis]): string {
  return `foot ${HELD[ends.bottom]}, head ${HELD[ends.top]}`
}

function endsInWords(ends: ColumnDrawing['ends'][Axis]): string {
  return `Foot ${HELD[ends.bottom]} and head ${HELD[ends.top]}`
}

function lengthInWords(axis: Axis, length: EffectiveLength, system: UnitSystem): string {
  const label = (mm: number) => computedLengthLabel(mm, system)
  const parts = length.segments.map(({ from, to, k, kl }) => {
    const where = `${heightLabel(from, system)} to ${heightLabel(to, system)}`
    return k === null || kl === null
      ? `${where} has no K of its own`
      : `${where} K ${k.toFixed(2)}, K·L ${label(kl)}`
  })
  const by =
    length.governedBy === 'eigenvalue' ? 'the eigenvalue method governs' : 'the segment method governs'
  const name = axis === 'strong' ? 'Strong axis' : 'Weak axis'
  return `${name}: effective length ${label(length.used)}, ${by}; ${parts.join('; ')}.`
}
