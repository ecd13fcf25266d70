import type { QuoteDto } from '../../../shared/contracts/quotes.ts'
import { detailLabel } from '../../../shared/drawing/labels.ts'
import type { UnitSystem } from '../../../shared/units/step.ts'
import { percentOf } from '../../format/decimals.ts'
import { editOf, type LineEdit, type PlateEdit, type RevisionEdit } from './revision-edit.ts'

type LineKey = keyof LineEdit
const NAMES: Record<LineKey, string> = {
  mark: 'mark',
  quantity: 'quantity',
  section: 'section',
  grade: 'steel',
  height: 'height',
  finish: 'finish',
  base: 'base plate',
  cap: 'cap plate',
  rods: 'anchor rods',
  welds: 'welds',
  extras: 'extras',
  overrides: 'what is set by hand',
}
const KEYS = Object.keys(NAMES) as LineKey[]
const same = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b)

export interface Change {
  /** "A1, section". */
  what: string
  before: string
  after: string
}

/** What somebody else changed between two readings of a quote, in words. */
export function changesBetween(before: QuoteDto, after: QuoteDto, system: UnitSystem): Change[] {
  const [one, other] = [before.current, after.current]
  const changes: Change[] = []
  const tell = (what: string, a: string, b: string) => changes.push({ what, before: a, after: b })
  if (one.letter !== other.letter) tell('revision', one.letter, other.letter)
  if (one.status !== other.status) tell('state', one.status, other.status)
  if (one.discount !== other.discount) {
    tell('discount', `${percentOf(one.discount)} %`, `${percentOf(other.discount)} %`)
  }
  if (one.note !== other.note) tell('note', one.note || 'none', other.note || 'none')
  const earlier = editOf(one).lines
  editOf(other).lines.forEach((spec, index) => {
    const was = earlier[index]
    if (!was) return tell(spec.mark, 'not there', 'added')
    for (const key of KEYS) {
      if (same(was[key], spec[key])) continue
      tell(`${spec.mark}, ${NAMES[key]}`, textOf(was, key, system), textOf(spec, key, system))
    }
  })
  return changes
}

function textOf(line: LineEdit, key: LineKey, system: UnitSystem): string {
  const label = (mm: number | undefined) => (mm === undefined ? '?' : detailLabel(mm, system))
  const plate = ({ length, width, thickness }: PlateEdit) => [length, width, thickness].map(label).join(' × ')
  switch (key) {
    case 'base':
    case 'cap': {
      const value = line[key]
      return value ? plate(value) : 'none'
    }
    case 'rods':
      return line.rods ? `${line.rods.count} Ø ${label(line.rods.diameter)} ${line.rods.grade}` : 'none'
    case 'welds':
      return line.welds.map((weld) => `${weld.where} ${label(weld.leg)}`).join(', ') || 'none'
    case 'extras':
      return line.extras.map((extra) => extra.description).join(', ') || 'none'
    case 'overrides':
      return line.overrides.map(({ item, value }) => `${item} ${value}`).join(', ') || 'nothing'
    case 'height':
      return label(line.height)
    default:
      return String(line[key])
  }
}

/**
 * An edit carried over to what somebody else has kept meanwhile: where only they changed something theirs stands, where
 * this edit did, it stays.
 */
export function carryOver(edit: RevisionEdit, before: RevisionEdit, after: RevisionEdit): RevisionEdit {
  const carried = structuredClone(after)
  if (edit.discount !== before.discount) carried.discount = edit.discount
  if (edit.note !== before.note) carried.note = edit.note
  carried.lines.forEach((line, index) => {
    const [mine, was] = [edit.lines[index], before.lines[index]]
    if (!mine || !was) return
    for (const key of KEYS) {
      if (!same(mine[key], was[key])) Object.assign(line, { [key]: mine[key] })
    }
  })
  return carried
}

/** Whether an edit differs from what is kept. */
export function isChanged(edit: RevisionEdit, quote: QuoteDto): boolean {
  return !same(edit, editOf(quote.current))
}
