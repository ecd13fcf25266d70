import { describe, expect, it } from 'vitest'
import { requestBody } from '../../shared/contracts/requests.ts'
import { lineRequirement } from '../../shared/contracts/requirement.ts'
import { copyLine, newLine, nextMark } from '../../web/features/requests/line-draft.ts'
import { takenAs } from '../../web/features/requests/line-defaults.ts'
import { fromRequirement, toRequirement } from '../../web/features/requests/line-requirement.ts'
import { issuesOf, newRequest, toBody } from '../../web/features/requests/request-draft.ts'

function filled() {
  const draft = newRequest()
  const [line] = draft.lines
  if (!line) throw new Error('a request begins with one column')
  line.height = 6400
  line.loads.dead = 420_000
  draft.title = 'North hall'
  draft.shipTo = { address: '2 Quarry Road', region: 'Ashford', km: 40 }
  return { draft, line }
}

describe('a request as it is written', () => {
  it('needs six inputs for a first column', () => {
    const paths = issuesOf(newRequest()).map((issue) => issue.path)
    expect(paths).toEqual([
      'lines.0.height',
      'lines.0.loads.dead',
      'title',
      'shipTo.address',
      'shipTo.region',
      'shipTo.km',
    ])
    expect(issuesOf(filled().draft)).toEqual([])
  })

  it('is what the API takes, with everything else at its default', () => {
    const body = requestBody.parse(toBody(filled().draft))
    expect(body.lines[0]).toMatchObject({
      mark: 'A1',
      quantity: 1,
      standard: 'AISC 360-22',
      method: 'LRFD',
      height: 6400,
      loads: { dead: 420_000, live: 0, wind: { pushes: 0, lifts: 0 } },
      limits: { maxUtilisation: 1 },
      finish: 'prime',
    })
    expect(body.neededBy).toBeNull()
  })

  it('finds wrong geometry at its field, by the rules of the engine', () => {
    const { draft, line } = filled()
    line.braces.push({ height: 6390, holds: 'weak', stopsTwist: true })
    expect(issuesOf(draft).map((issue) => issue.path)).toEqual(['lines.0.braces.0.height'])
    line.braces = []
    line.ends.weak = { bottom: 'pinned', top: 'free' }
    expect(issuesOf(draft).map((issue) => issue.path)).toEqual(['lines.0.ends.weak.top'])
  })

  it('takes no mark twice', () => {
    const { draft, line } = filled()
    draft.lines.push(copyLine(line, 'A1'))
    expect(issuesOf(draft)).toEqual([{ path: 'lines.1.mark', message: 'A1 is already another column' }])
  })
})

describe('a line', () => {
  it('comes back from what was kept as it was', () => {
    const kept = lineRequirement.parse({
      mark: 'B7',
      quantity: 12,
      standard: 'EN 1993-1-1',
      height: 4200,
      ends: { strong: { bottom: 'fixed', top: 'pinned' }, weak: { bottom: 'pinned', top: 'pinned' } },
      braces: [{ height: 2100, holds: 'weak', stopsTwist: false }],
      loads: { dead: 300_000, wind: { lifts: 20_000 }, earthquake: { vertical: 5000 } },
      combinations: 'EN 1990 6.10ab',
      liveCategory: 'E',
      offset: { strong: 30, weak: 0 },
      grade: 'S355',
      limits: { families: ['HEB'], maxDepth: 300, maxUtilisation: 0.9, maxSlenderness: 180 },
      finish: 'galvanise',
      base: { plate: true, rods: false, concrete: { strength: 30, pier: { length: 600, width: 500 } } },
      cap: { plate: false },
    })
    expect(lineRequirement.parse(toRequirement(fromRequirement(kept)))).toEqual(kept)
  })

  it('copies deeply under a mark of its own', () => {
    const line = newLine('A1')
    line.braces.push({ height: 3000, holds: 'both', stopsTwist: true })
    const copy = copyLine(line, 'A2')
    copy.braces[0]!.height = 1000
    expect(line.braces[0]?.height).toBe(3000)
    expect([copy.mark, copy.key === line.key]).toEqual(['A2', false])
  })

  it.each([
    ['A1', ['A1'], 'A2'],
    ['A1', ['A1', 'A2', 'A3'], 'A4'],
    ['C09', ['C09'], 'C10'],
    ['Lobby', ['Lobby'], 'Lobby2'],
  ])('after %s beside %j is %s', (mark, taken, next) => {
    expect(nextMark(mark, taken)).toBe(next)
  })

  it('says what nobody asked for', () => {
    const text = takenAs(newLine('A1'))
    for (const part of [
      'AISC 360-22 LRFD',
      'ASCE 7-22 combinations',
      'pinned both ends',
      'A992',
      'own weight',
    ]) {
      expect(text).toContain(part)
    }
  })
})
