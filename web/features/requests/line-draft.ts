import type { LineRequirement, LineRequirementInput } from '../../../shared/contracts/requirement.ts'
import type { Finish } from '../../../shared/pricing/line-spec.ts'
import type { Family } from '../../../shared/sections/section.ts'
import type { Brace, Column, EndFixity } from '../../../shared/stability/column.ts'

type Standard = LineRequirement['standard']
type Number_ = number | undefined

/** Loads by their case, N; wind and earthquake each way. */
export interface LoadDraft {
  dead: Number_
  live: Number_
  roofLive: Number_
  snow: Number_
  rain: Number_
  windPushes: Number_
  windLifts: Number_
  earthquakePushes: Number_
  earthquakeLifts: Number_
  earthquakeVertical: Number_
}

/** One mark while it is being described: a field may still be empty, and is then not sent. mm, N, MPa. */
export interface LineDraft {
  /** Names the line on this page only. */
  key: string
  mark: string
  quantity: Number_
  height: Number_
  ends: Column['ends']
  braces: Brace[]
  loads: LoadDraft
  offsetStrong: Number_
  offsetWeak: Number_
  standard: Standard
  method: 'LRFD' | 'ASD'
  combinations: LineRequirement['combinations'] | null
  liveFactor: 0.5 | 1
  liveCategory: LineRequirement['liveCategory']
  endFixity: EndFixity
  selfWeight: boolean
  grade: string
  families: Family[]
  maxDepth: Number_
  maxWidth: Number_
  /** Percent. */
  maxUtilisation: Number_
  finish: Finish
  basePlate: boolean
  rods: boolean
  capPlate: boolean
  concreteStrength: Number_
  pierLength: Number_
  pierWidth: Number_
  /** Another shape than the cheapest, to look at. */
  look: string | null
  /** What an earlier answer held that this page does not show; kept as it was. */
  kept: Partial<LineRequirementInput>
}

const NO_LOADS: LoadDraft = {
  dead: undefined,
  live: undefined,
  roofLive: undefined,
  snow: undefined,
  rain: undefined,
  windPushes: undefined,
  windLifts: undefined,
  earthquakePushes: undefined,
  earthquakeLifts: undefined,
  earthquakeVertical: undefined,
}

export function newLine(mark: string): LineDraft {
  const pinned = () => ({ bottom: 'pinned', top: 'pinned' }) as const
  return {
    key: crypto.randomUUID(),
    mark,
    quantity: 1,
    height: undefined,
    ends: { strong: pinned(), weak: pinned() },
    braces: [],
    loads: { ...NO_LOADS },
    offsetStrong: undefined,
    offsetWeak: undefined,
    standard: 'AISC 360-22',
    method: 'LRFD',
    combinations: null,
    liveFactor: 0.5,
    liveCategory: 'B',
    endFixity: 'recommended',
    selfWeight: true,
    grade: '',
    families: [],
    maxDepth: undefined,
    maxWidth: undefined,
    maxUtilisation: undefined,
    finish: 'prime',
    basePlate: true,
    rods: true,
    capPlate: true,
    concreteStrength: 28,
    pierLength: undefined,
    pierWidth: undefined,
    look: null,
    kept: {},
  }
}

/** The next mark after one: A1 gives A2, B gives B2. */
export function nextMark(mark: string, taken: readonly string[]): string {
  const found = /^(.*?)(\d+)$/.exec(mark)
  const stem = found?.[1] ?? mark
  let number = found ? Number(found[2]) : 1
  let next: string
  do next = `${stem}${(number += 1)}`
  while (taken.includes(next))
  return next
}

export function copyLine(line: LineDraft, mark: string): LineDraft {
  const copy = JSON.parse(JSON.stringify(line)) as LineDraft
  return { ...newLine(mark), ...copy, key: crypto.randomUUID(), mark }
}
