import { describe, expect, it } from 'vitest'
import { catalogue } from '../../../seeds/reference/catalogue.ts'
import { columnCheck } from '../../../shared/contracts/checks.ts'
import { steelFor } from '../../../shared/materials/steel-for.ts'
import type { Ends } from '../../../shared/stability/column.ts'
import { checkColumn } from '../../../shared/standards/check-column.ts'
import type { ColumnRequest } from '../../../shared/standards/column-request.ts'
import { prepareColumn } from '../../../shared/standards/prepare-column.ts'

const pinned: Ends = { bottom: 'pinned', top: 'pinned' }
const ends = { strong: pinned, weak: pinned }
const kN = 1000
const office: ColumnRequest = { height: 4200, ends, loads: { dead: 180 * kN, live: 260 * kN } }

function check(asked: ColumnRequest, designation = 'W10X49') {
  const section = catalogue.find(designation)
  if (!section) throw new Error(`no ${designation}`)
  return checkColumn(prepareColumn(asked), section, steelFor(asked.grade, section))
}

describe('the answer', () => {
  it('has the shape that the API promises; the parts between twist stops alone stay inside', () => {
    const answer = check(office)
    const { lengths } = answer
    const promised = { ...answer, lengths: { ...lengths, torsion: { used: lengths.torsion.used } } }
    expect(columnCheck.parse(answer)).toEqual(promised)
    expect(Object.keys(answer.values)).toEqual(
      expect.arrayContaining([
        ...['area', 'slendernessStrong', 'slendernessWeak', 'Fe', 'Fn', 'effectiveArea'],
        ...['nominal', 'available', 'required', 'tensionAvailable'],
      ]),
    )
  })

  it('ends each way of buckling with the strength that it names', () => {
    for (const designation of ['W10X49', 'W14X30', 'HSS12X8X3/16', 'HSS16.000X0.250', 'PIPE6STD']) {
      const ways = check(office, designation).checks.filter(({ clause }) => clause.startsWith('E3'))
      expect(ways).toHaveLength(2)
      for (const { steps, capacity } of ways) expect(steps.at(-1)?.value).toBe(capacity)
    }
  })

  /* ASCE 7-22 2.3.1, by hand: 1.2 × 180 + 1.6 × 260 = 632 kN; 72.9 kg/m of column, 4.2 m: 1.2 × 3.0 kN more. */
  it('names the combination that governs, the column’s weight in it', () => {
    const bare = check({ ...office, selfWeight: false })
    expect(bare.values.required).toBeCloseTo(632 * kN, 3)
    expect(bare.governing.combination).toBe('1.2D+1.6L')
    expect(Number(check(office).values.required) - 632 * kN).toBeCloseTo(1.2 * 72.9 * 4.2 * 9.80665, -2)
  })

  /* ASCE 7-22 combination 5, by hand: 0.9 × 100 − 500 = −410 kN. */
  it('lets uplift govern where it works harder than compression', () => {
    const loads = { dead: 100 * kN, wind: { lifts: 500 * kN } }
    const answer = check({ height: 2500, ends, loads, selfWeight: false })
    expect(answer.values.uplift).toBeCloseTo(410 * kN, 3)
    expect(answer.governing).toMatchObject({ check: 'tension', clause: 'D2', combination: '0.9D−W' })
    const tension = answer.checks.find(({ clause }) => clause === 'D2')
    expect(tension?.capacity).toBe(answer.values.tensionAvailable)
    expect(check(office).checks.some(({ clause }) => clause === 'D2')).toBe(false)
  })

  it('fails by a strength that is just too small, and holds by one that is just enough', () => {
    const capacity = Number(check(office).values.available)
    const asked = (axial: number): ColumnRequest => ({ height: 4200, ends, required: { axial } })
    expect(check(asked(capacity * 0.999)).verdict).toBe('holds')
    expect(check(asked(capacity * 1.001)).verdict).toBe('fails')
  })
})

describe('a head that is free above a brace', () => {
  const fixedFree: Ends = { bottom: 'fixed', top: 'free' }
  const asked: ColumnRequest = {
    ...{ height: 6000, ends: { strong: fixedFree, weak: fixedFree }, loads: { dead: 50 * kN } },
    braces: [{ height: 3000, holds: 'both', stopsTwist: true }],
  }
  it('counts as no stiffer than a cantilever from the brace, and is warned of in words', () => {
    const { lengths, warnings } = check(asked)
    // A brace holds the free part less than a rigid wall would: 2.0 × 3 m at least.
    for (const axis of [lengths.strong, lengths.weak]) {
      expect(axis.governedBy).toBe('eigenvalue')
      expect(axis.used).toBeGreaterThanOrEqual(2 * 3000)
      expect(axis.segments.at(-1)?.k).toBeNull()
    }
    expect(warnings.filter((one) => one.includes('free to sway'))).toHaveLength(2)
  })
  it('is not warned of where the head is held', () => {
    const held: Ends = { bottom: 'fixed', top: 'pinned' }
    const { warnings } = check({ ...asked, ends: { strong: held, weak: held } })
    expect(warnings.some((one) => one.includes('free to sway'))).toBe(false)
  })
})

describe('what is advised', () => {
  /* ANSI/AISC 360-22 E2, user note: Lc/r preferably at most 200. W6X15: ry = 1.45 in = 36.8 mm, so 7.37 m. */
  it('warns over Lc/r = 200 and not under it, and neither is a failure', () => {
    const asked = (height: number): ColumnRequest => ({ height, ends, loads: { dead: 5 * kN } })
    const over = check(asked(7450), 'W6X15')
    expect(over.warnings.some((one) => one.includes('E2'))).toBe(true)
    expect(over.verdict).toBe('holds')
    expect(check(asked(7300), 'W6X15').warnings).toEqual([])
  })
})

describe('what was taken because nobody said', () => {
  const said = (asked: ColumnRequest) => check(asked).assumptions.join(' ')
  it('names every default, and none that was given', () => {
    const bare = said(office)
    for (const part of [
      'AISC 360-22, LRFD',
      'ASCE 7-22',
      'f1 = 0.5',
      'weight of the column itself is added',
      'recommended ones',
      'along the axis',
    ]) {
      expect(bare).toContain(part)
    }
    const given = said({
      ...{ ...office, standard: 'AISC 360-22', method: 'LRFD', combinations: 'ASCE 7-22', liveFactor: 1 },
      ...{ selfWeight: false, endFixity: 'theoretical', grade: 'A992' },
    })
    expect(given).not.toMatch(/ASCE 7|f1|weight of the column|Steel is|recommended/)
    expect(given).toContain('theoretical ones')
  })
  it('speaks of f1 only where it counts', () => {
    expect(said({ ...office, method: 'ASD' })).not.toContain('f1')
    expect(said({ height: 4200, ends, loads: { dead: 1 * kN } })).not.toContain('f1')
  })
  it('says when no height leaves the column’s weight out', () => {
    const lengths = { strong: 4200, weak: 4200, torsion: 4200 }
    const { loads } = office
    expect(said({ lengths, loads })).toContain('left out, as no height is given')
    expect(check({ lengths, loads }).values.required).toBeCloseTo(632 * kN, 3)
    expect(said({ lengths, height: 4200, loads })).toContain('weight of the column itself is added')
  })
  it('says of braces what they must be', () => {
    const braces: ColumnRequest['braces'] = [{ height: 2100, holds: 'weak', stopsTwist: true }]
    expect(said({ ...office, braces })).toContain('rigid and as holding translation only')
    expect(said(office)).not.toContain('Braces')
  })
  it('says what no answer covers', () => {
    expect(check(office).notCovered.join(' ')).toMatch(/sway[\s\S]*breakout[\s\S]*fire[\s\S]*[Ss]eismic/)
  })
})
