import { describe, expect, it } from 'vitest'
import { proposal } from '../../../shared/contracts/proposals.ts'
import type { LineAsked } from '../../../shared/proposal/line-asked.ts'
import { Refusal } from '../../../shared/units/refusal.ts'
import { found, proposeLine } from '../../support/line-asked.ts'

describe('a proposal', () => {
  const answer = found(proposeLine())

  it('is checked in full, priced as a quote of one line, and shows what else would do', () => {
    const { check, base, spec, section, alternatives, price } = answer
    expect(check.verdict).toBe('holds')
    expect(base?.verdict).toBe('holds')
    expect(spec).toMatchObject({ mark: 'A1', quantity: 4, section, height: 4800, finish: 'prime' })
    expect(spec.base).toMatchObject({ length: base?.plate.length, thickness: base?.plate.thickness })
    expect(alternatives.length).toBeGreaterThanOrEqual(6)
    expect(alternatives[0]?.unitPrice).toEqual(price.lines[0]?.unitPrice)
    expect(alternatives[0]?.utilisation).toBeCloseTo(check.utilisation, 12)
    expect(new Set(alternatives.map((one) => one.section)).size).toBe(alternatives.length)
  })

  it('is what the contract says', () => {
    expect(proposal.safeParse(JSON.parse(JSON.stringify(answer))).error).toBeUndefined()
  })

  it('keeps every limit in every alternative', () => {
    const limits = { maxDepth: 210, maxWidth: 210, maxUtilisation: 0.8, maxSlenderness: 110 }
    const { alternatives, check } = found(proposeLine({ limits }))
    expect(Number(check.values.slendernessWeak)).toBeLessThanOrEqual(110)
    for (const { depth, width, utilisation } of alternatives) {
      expect(depth).toBeLessThanOrEqual(210)
      expect(width).toBeLessThanOrEqual(210)
      expect(utilisation).toBeLessThanOrEqual(0.8)
    }
  })

  it('keeps to the families that are asked for', () => {
    const { alternatives } = found(proposeLine({ limits: { maxUtilisation: 1, families: ['PIPE'] } }))
    expect(new Set(alternatives.map(({ family }) => family))).toEqual(new Set(['PIPE']))
  })

  it('leaves plates and rods out where they are not wanted', () => {
    const bare = { plate: false, rods: false, concrete: { strength: 28 } }
    const { spec, base } = found(proposeLine({ base: bare, cap: { plate: false } }))
    expect(base).toBeNull()
    expect(spec).toMatchObject({ base: null, cap: null, rods: null, welds: [] })
  })
})

describe('a shape by its name', () => {
  it('is proposed as it is, with the cheapest ones beside it', () => {
    const named = found(proposeLine({}, { section: 'w14 x 90' }))
    expect(named.section).toBe('W14X90')
    expect(named.check.verdict).toBe('holds')
    expect(named.alternatives.map((one) => one.section)).toEqual(
      found(proposeLine()).alternatives.map((one) => one.section),
    )
    expect(named.price.total.amount).toBeGreaterThan(found(proposeLine()).price.total.amount)
  })

  it('fails in the answer where it is too weak', () => {
    const { check, section } = found(proposeLine({}, { section: 'W6X9' }))
    expect(section).toBe('W6X9')
    expect(check.verdict).toBe('fails')
    expect(check.utilisation).toBeGreaterThan(1)
  })
})

describe('the next lighter shape', () => {
  const next = (change: Partial<LineAsked>, section?: string) =>
    found(proposeLine(change, { section })).nextLighter

  it('is lighter, of the same family, and says what is wrong with it', () => {
    const limits = { maxUtilisation: 1, families: ['W'] } as const
    const { alternatives, section, nextLighter } = found(proposeLine({ limits }))
    const weak = found(proposeLine({ limits }, { section: nextLighter?.section }))
    expect(weak.spec.section.startsWith('W')).toBe(true)
    const mass = alternatives.find((one) => one.section === section)?.mass ?? 0
    expect(weak.price.mass).toBeLessThan(mass * 4.8 * 4 * 1.3)
    expect(weak.check.verdict).toBe('fails')
    expect(nextLighter?.reason).toContain(`${Math.ceil(weak.check.utilisation * 100)} %`)
  })

  it('does not say that it costs no less where it does', () => {
    const lighter = next({}, 'W14X90')
    const price = (section: string) => found(proposeLine({}, { section })).price.total.amount
    expect(price(lighter?.section ?? '')).toBeLessThan(price('W14X90'))
    expect(lighter?.reason).toContain('costs less')
  })

  it('names the limit that it breaks', () => {
    expect(next({ limits: { maxUtilisation: 1, maxWidth: 340 } }, 'W14X68')?.reason).not.toContain('limit')
    expect(next({ limits: { maxUtilisation: 1, maxDepth: 300 } }, 'W14X90')?.reason).toContain('mm deep')
  })
})

describe('what cannot be taken is refused by its field', () => {
  it.each<[string, Partial<LineAsked>, string | undefined]>([
    ['quantity', { quantity: 1.5 }, undefined],
    [
      'height',
      { height: undefined, ends: undefined, lengths: { strong: 4e3, weak: 4e3, torsion: 4e3 } },
      undefined,
    ],
    ['section', {}, 'W0X0'],
    ['section', {}, 'HEB 200'],
    ['grade', { grade: 'S235' }, undefined],
    ['limits.families', { limits: { maxUtilisation: 1, families: ['HEB'] } }, undefined],
    ['height', { height: 0 }, undefined],
  ])('%s', (path, change, section) => {
    let refused: unknown
    try {
      proposeLine(change, { section })
    } catch (error) {
      refused = error
    }
    expect(refused).toBeInstanceOf(Refusal)
    expect((refused as Refusal).issues.map((issue) => issue.path)).toContain(path)
  })
})
