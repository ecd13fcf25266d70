import { describe, expect, it } from 'vitest'
import { DEFAULT_PRICE_BOOK as book } from '../../../seeds/reference/price-book.ts'
import type { LineSpec } from '../../../shared/pricing/line-spec.ts'
import { workOutLine } from '../../../shared/proposal/work-out-line.ts'
import { Refusal } from '../../../shared/units/refusal.ts'
import { sectionCalled } from '../../support/base-input.ts'
import { found, lineAsked, proposeLine } from '../../support/line-asked.ts'

// Heavy enough to be a column and not a post.
const proposed = found(proposeLine({}, { section: 'W14X90' }))
const work = (change: Partial<LineSpec> = {}) => {
  const spec = { ...proposed.spec, ...change }
  return workOutLine(lineAsked(), spec, sectionCalled(spec.section), book)
}
const plate = proposed.spec.base ?? { length: 0, width: 0, thickness: 0, holes: { count: 0, diameter: 0 } }

describe('a line as the estimator has it', () => {
  it('works out as it was proposed while nothing is changed', () => {
    const { check, base } = work()
    expect(check).toEqual(proposed.check)
    expect(base?.verdict).toBe('holds')
    expect(base?.plate).toEqual(proposed.base?.plate)
    expect(base?.rods.positions).toEqual(proposed.base?.rods.positions)
  })

  it('answers for another shape, height and steel', () => {
    expect(work({ section: 'W6X9', grade: 'A992' }).check.verdict).toBe('fails')
    expect(work({ height: 6500 }).check.utilisation).toBeGreaterThan(proposed.check.utilisation)
    const named = { section: 'W14X90', grade: 'A992' }
    const weaker = work({ ...named, grade: 'A36' }).check.utilisation
    expect(weaker).toBeGreaterThan(work(named).check.utilisation)
  })

  it.each([
    ['thinner', { ...plate, thickness: 6 }],
    ['too small for the shaft', { ...plate, length: 90 }],
    ['on three rods', { ...plate, holes: { ...plate.holes, count: 3 } }],
  ])('fails with a plate %s', (_name, base) => {
    const rods = proposed.spec.rods && { ...proposed.spec.rods, count: base.holes.count }
    expect(work({ base, rods }).base?.verdict).toBe('fails')
  })

  it('has no base to check where there is no plate', () => {
    expect(work({ base: null, rods: null }).base).toBeNull()
  })

  it('refuses a steel that the shape is not made of', () => {
    expect(() => work({ grade: 'S235' })).toThrow(Refusal)
  })
})
