import { compare, subtract, type Money } from '../pricing/money.ts'
import type { Family } from '../sections/section.ts'
import type { Axis, Ends } from '../stability/column.ts'
import { Refusal } from '../units/refusal.ts'
import { familiesFor } from './candidates.ts'
import type { LineAsked } from './line-asked.ts'
import type { PriceTerms } from './price-terms.ts'

export interface Advice {
  /** What the customer would change, in words. */
  change: string
  section: string
  saves: Money
  unitPrice: Money
}

interface Change {
  change: string
  asked: LineAsked
}

/** The cheapest of a line with its price; undefined where nothing fits. */
export type FindCheapest = (
  asked: LineAsked,
) => { section: string; unitPrice: Money; delivered: Money } | undefined

/** Braces are tried at these parts of the height; closer than this to an end or another there is no room, mm. */
const PLACES = [1 / 3, 1 / 2, 2 / 3]
const CLEAR = 300

/**
 * Changes that a customer could make, each with the money that it saves, the largest first: one brace more at its best
 * height, a fixed foot, ends that can be built as drawn, a tenth less load, another family, another steel.
 */
export function adviceFor(asked: LineAsked, now: Money, terms: PriceTerms, find: FindCheapest): Advice[] {
  const groups = [
    braces(asked),
    fixedFoot(asked),
    actualEnds(asked),
    lessLoad(asked),
    families(asked, terms),
    steels(asked),
  ]
  const found = groups.flatMap((changes) => {
    const best = changes
      .flatMap((change) => tried(change, now, find))
      .sort((a, b) => compare(b.saves, a.saves))
    return best.slice(0, 1)
  })
  return found.sort((a, b) => compare(b.saves, a.saves))
}

function tried({ change, asked }: Change, now: Money, find: FindCheapest): Advice[] {
  try {
    const cheaper = find(asked)
    if (!cheaper || compare(cheaper.delivered, now) >= 0) return []
    const { section, unitPrice } = cheaper
    return [{ change, section, unitPrice, saves: subtract(now, cheaper.delivered) }]
  } catch (error) {
    // What cannot be taken is no advice.
    if (error instanceof Refusal) return []
    throw error
  }
}

function metres(mm: number): string {
  return `${(mm / 1000).toFixed(2)} m`
}

function braces(asked: LineAsked): Change[] {
  const { height, braces: there = [], ends } = asked
  if (height === undefined || !ends || there.length >= 20) return []
  const heights = PLACES.map((part) => Math.round((height * part) / 50) * 50).filter(
    (at) => at > CLEAR && at < height - CLEAR && there.every((brace) => Math.abs(brace.height - at) > CLEAR),
  )
  return heights.flatMap((at) =>
    (['weak', 'both'] as const).map((holds) => ({
      change: `One brace more at ${metres(at)}, holding ${holds === 'weak' ? 'the weak axis' : 'both axes'} and twist`,
      asked: { ...asked, braces: [...there, { height: at, holds, stopsTwist: true }] },
    })),
  )
}

function fixedFoot(asked: LineAsked): Change[] {
  const { ends } = asked
  if (!ends || (ends.strong.bottom === 'fixed' && ends.weak.bottom === 'fixed')) return []
  const fixed = (about: Ends): Ends => ({ ...about, bottom: 'fixed' })
  return [
    {
      change: 'A foot that is fixed about both axes, with a base and footing made for it',
      asked: { ...asked, ends: { strong: fixed(ends.strong), weak: fixed(ends.weak) } },
    },
  ]
}

function actualEnds(asked: LineAsked): Change[] {
  const { ends, endFixity = 'recommended' } = asked
  const fixed = (axis: Axis) => ends && [ends[axis].bottom, ends[axis].top].includes('fixed')
  if (endFixity === 'theoretical' || !(fixed('strong') || fixed('weak'))) return []
  const change = 'Fixed ends that the engineer of record shows to be rigid (theoretical K)'
  return [{ change, asked: { ...asked, endFixity: 'theoretical' } }]
}

const LESS = 0.9

function lessLoad(asked: LineAsked): Change[] {
  const { loads, required } = asked
  const less = (value: number | undefined) => (value === undefined ? undefined : value * LESS)
  const change = 'A tenth less load'
  if (required)
    return [{ change, asked: { ...asked, required: { ...required, axial: required.axial * LESS } } }]
  if (!loads) return []
  const { dead, live, roofLive, snow, rain, wind, earthquake } = loads
  return [
    {
      change,
      asked: {
        ...asked,
        loads: {
          ...{
            dead: less(dead),
            live: less(live),
            roofLive: less(roofLive),
            snow: less(snow),
            rain: less(rain),
          },
          wind: { pushes: less(wind?.pushes), lifts: less(wind?.lifts) },
          earthquake: {
            pushes: less(earthquake?.pushes),
            lifts: less(earthquake?.lifts),
            vertical: less(earthquake?.vertical),
          },
        },
      },
    },
  ]
}

/** Families that were kept out, all let in. */
function families(asked: LineAsked, { book }: PriceTerms): Change[] {
  const wanted: readonly Family[] = asked.limits.families ?? []
  if (wanted.length === 0) return []
  const all = familiesFor({ standard: asked.standard, limits: { ...asked.limits, families: [] } }, book)
  if (all.every((family) => wanted.includes(family))) return []
  const limits = { ...asked.limits, families: all }
  return [{ change: 'Any family of shapes that the shop buys', asked: { ...asked, limits } }]
}

/** A steel that was asked for, left to the usual one of each family. */
function steels({ grade, ...asked }: LineAsked): Change[] {
  if (grade === undefined) return []
  return [{ change: 'The usual steel of each shape', asked }]
}
