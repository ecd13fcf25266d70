import { describe, expect, it } from 'vitest'
import { approvalBlockers, approvalFault } from '../../../shared/quoting/approval.ts'
import { compareLetters, nextLetter, nextNumber, numberOf } from '../../../shared/quoting/numbering.ts'
import {
  answerFault,
  holdsUntil,
  isEditable,
  isExpired,
  isPublic,
} from '../../../shared/quoting/revisions.ts'
import { releaseFault } from '../../../shared/quoting/release.ts'
import { REVISION_STATUSES } from '../../../shared/quoting/statuses.ts'

describe('numbers and letters', () => {
  it('start at 1001 and go on by one', () => {
    expect(nextNumber('request', null)).toBe('R-1001')
    expect(nextNumber('quote', 'Q-1001')).toBe('Q-1002')
    expect(nextNumber('order', 'O-9999')).toBe('O-10000')
    expect(numberOf('order', 250)).toBe('O-1250')
  })

  it.each(['R-1001', 'Q-1000', 'Q-', 'Q-12x', ''])('%j is no quote number to go on from', (last) => {
    expect(() => nextNumber('quote', last)).toThrow('number: a number of the kind Q-1001')
  })

  it.each([
    ['A', 'B'],
    ['Y', 'Z'],
    ['Z', 'AA'],
    ['AZ', 'BA'],
    ['ZY', 'ZZ'],
  ])('after revision %s comes %s', (letter, next) => {
    expect(nextLetter(letter)).toBe(next)
    expect(compareLetters(letter, next)).toBeLessThan(0)
  })

  it('never gives a letter twice', () => {
    const letters = ['A']
    while (letters.at(-1) !== 'ZZ') letters.push(nextLetter(letters.at(-1) ?? ''))
    expect(new Set(letters).size).toBe(26 + 26 * 26)
    expect([...letters].sort(compareLetters)).toEqual(letters)
    expect(() => nextLetter('ZZ')).toThrow('letter: ZZ is the last')
    expect(() => nextLetter('a')).toThrow('letter')
  })
})

describe('a revision', () => {
  it('can be changed as a draft alone and is seen once sent', () => {
    expect(REVISION_STATUSES.filter(isEditable)).toEqual(['draft'])
    expect(REVISION_STATUSES.filter(isPublic)).toEqual([
      'sent',
      'accepted',
      'declined',
      'expired',
      'superseded',
    ])
  })

  it('holds to the end of its last day', () => {
    const until = holdsUntil('2026-12-10T15:20:00.000Z', 21)
    expect(until).toBe('2026-12-31T23:59:59.999Z')
    expect(isExpired(until, '2026-12-31T23:59:59.999Z')).toBe(false)
    expect(isExpired(until, '2027-01-01T00:00:00.000Z')).toBe(true)
    expect(isExpired(null, '2027-01-01T00:00:00.000Z')).toBe(false)
    // Another zone, the same moment.
    expect(isExpired(until, '2027-01-01T00:59:00+01:00')).toBe(false)
  })

  it('is answered while sent and fresh, and says why not otherwise', () => {
    const validUntil = '2026-12-31T23:59:59.999Z'
    const fault = (status: (typeof REVISION_STATUSES)[number], now = '2026-12-12T00:00:00Z') =>
      answerFault({ status, validUntil }, now)
    expect(REVISION_STATUSES.filter((status) => fault(status) === null)).toEqual(['sent'])
    expect(fault('sent', '2027-01-02T00:00:00Z')).toContain('repriced')
    expect(fault('superseded')).toContain('newer revision')
    expect(fault('accepted')).toContain('already been accepted')
  })
})

describe('approval', () => {
  const usd = (amount: number) => ({ amount, currency: 'USD' })

  it.each([
    [2_500_000, 'mara', 'mara', true],
    [2_500_001, 'mara', 'mara', false],
    [2_500_001, 'mara', 'odile', true],
    [1, 'mara', 'odile', true],
  ])('%d prepared by %s, approved by %s: %s', (total, preparedBy, approver, allowed) => {
    const fault = approvalFault({ total: usd(total), limit: usd(2_500_000), preparedBy, approver })
    expect(fault === null).toBe(allowed)
    if (fault) expect(fault).toContain('USD 25000.00')
  })

  it('has no limit where none is set', () => {
    const fault = approvalFault({ total: usd(1e12), limit: null, preparedBy: 'mara', approver: 'mara' })
    expect(fault).toBeNull()
  })

  it('is blocked by what does not hold and by what no bar takes', () => {
    const line = { mark: 'A1', utilisation: 0.8, holds: true, baseHolds: true }
    const steel = { section: 'W10X49', nest: { unplaced: [] } }
    expect(approvalBlockers({ lines: [line, { ...line, baseHolds: null }], steel: [steel] })).toEqual([])
    const blockers = approvalBlockers({
      lines: [
        { ...line, holds: false, utilisation: 1.003 },
        { ...line, mark: 'A2', holds: false, utilisation: Infinity },
        { ...line, mark: 'A3', baseHolds: false },
      ],
      steel: [{ ...steel, nest: { unplaced: [{ length: 19_000 }] } }],
    })
    expect(blockers).toEqual([
      'A1 does not hold: it works at 101 %',
      'A2 does not hold: it is unstable',
      'A3: its base plate does not hold',
      'W10X49: 19000 mm is longer than every bar and needs a splice',
    ])
  })
})

describe('release of an order', () => {
  const usd = (amount: number) => ({ amount, currency: 'USD' })

  it.each([
    [297_200, 297_200, false, true],
    [297_200, 297_199, false, false],
    [297_200, 300_000, false, true],
    [297_200, 0, true, true],
  ])('%d due, %d paid, credit terms %s: %s', (due, paid, creditTerms, allowed) => {
    const fault = releaseFault({ due: usd(due), paid: usd(paid), creditTerms })
    expect(fault === null).toBe(allowed)
    if (fault) expect(fault).toContain('USD 0.01')
  })
})
