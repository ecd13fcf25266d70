import { describe, expect, it } from 'vitest'
import { catalogue } from '../../../seeds/reference/catalogue.ts'
import { steelFor } from '../../../shared/materials/steel-for.ts'
import { EU_FAMILIES, US_FAMILIES } from '../../../shared/sections/catalogue.ts'
import type { Section } from '../../../shared/sections/section.ts'
import type { Ends } from '../../../shared/stability/column.ts'
import { checkColumn } from '../../../shared/standards/check-column.ts'
import type { ColumnRequest } from '../../../shared/standards/column-request.ts'
import { prepareColumn, type PreparedColumn } from '../../../shared/standards/prepare-column.ts'
import { screenColumn } from '../../../shared/standards/screen-column.ts'
import { Refusal } from '../../../shared/units/refusal.ts'

/* A shape that is proposed was screened, a shape that is shown was checked: one number, for every shape that there is. */

const pinned: Ends = { bottom: 'pinned', top: 'pinned' }
const fixedFree: Ends = { bottom: 'fixed', top: 'free' }
const kN = 1000

const COLUMNS: [string, ColumnRequest][] = [
  [
    'short, LRFD',
    { height: 2500, ends: { strong: pinned, weak: pinned }, loads: { dead: 300 * kN, live: 500 * kN } },
  ],
  [
    'tall, ASD, girts on a flange, in uplift',
    {
      ...{ method: 'ASD', height: 9000, ends: { strong: pinned, weak: pinned } },
      braces: [3000, 6000].map((height) => ({ height, holds: 'weak', stopsTwist: false, offset: 150 })),
      loads: { dead: 40 * kN, snow: 60 * kN, wind: { pushes: 30 * kN, lifts: 400 * kN } },
    },
  ],
  [
    'free at the head above a brace',
    {
      ...{ height: 7000, ends: { strong: fixedFree, weak: fixedFree } },
      braces: [{ height: 4000, holds: 'both', stopsTwist: true }],
      loads: { dead: 80 * kN, roofLive: 50 * kN },
    },
  ],
  [
    'loaded off both axes',
    {
      ...{ height: 4000, ends: { strong: pinned, weak: pinned }, offset: { strong: 180, weak: 40 } },
      loads: { dead: 60 * kN, live: 90 * kN },
    },
  ],
]

const BY_EN: [string, ColumnRequest][] = [
  [
    'EN 1993-1-1, with uplift',
    {
      ...{ standard: 'EN 1993-1-1', height: 5000, ends: { strong: pinned, weak: pinned } },
      loads: { dead: 100 * kN, live: 150 * kN, wind: { pushes: 20 * kN, lifts: 500 * kN } },
    },
  ],
]

/** What a clause refuses: the refusal's words, so that both can be held to refuse alike. */
function orRefusal<Answer>(work: () => Answer): Answer | string {
  try {
    return work()
  } catch (error) {
    if (error instanceof Refusal) return JSON.stringify(error.issues)
    throw error
  }
}

function holdsOneNumber(prepared: PreparedColumn, section: Section): void {
  const steel = steelFor(undefined, section)
  const quick = orRefusal(() => screenColumn(prepared, section, steel))
  const full = orRefusal(() => checkColumn(prepared, section, steel))
  if (typeof quick === 'string' || typeof full === 'string') {
    expect(full).toBe(quick)
    return
  }
  const { designation } = section
  expect([designation, full.utilisation]).toEqual([designation, quick.utilisation])
  expect([designation, full.values.available]).toEqual([designation, quick.capacity])
  expect([designation, full.values.tensionAvailable]).toEqual([designation, quick.tension])
  // Among the ways of buckling shown, the one said to govern is the weakest.
  const ways = full.checks.filter(({ clause }) => /^(E3|E4|6\.3\.1)/.test(clause))
  expect(Math.min(...ways.map(({ capacity }) => capacity))).toBeCloseTo(quick.capacity, 3)
}

describe('every shape is screened and checked to one number', () => {
  it.each(COLUMNS)('AISC 360: %s', (_, asked) => {
    const prepared = prepareColumn(asked)
    for (const section of catalogue.ofFamilies(US_FAMILIES)) holdsOneNumber(prepared, section)
  })
  it.each(BY_EN)('%s', (_, asked) => {
    const prepared = prepareColumn(asked)
    for (const section of catalogue.ofFamilies(EU_FAMILIES)) holdsOneNumber(prepared, section)
  })
})
