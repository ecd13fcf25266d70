import { describe, expect, it } from 'vitest'
import type { LineAsked } from '../../../shared/proposal/line-asked.ts'
import { found, proposeLine } from '../../support/line-asked.ts'

function nothing(change: Partial<LineAsked>) {
  const answer = proposeLine(change)
  if (answer.found) throw new Error(`found ${answer.section}`)
  return answer
}

describe('where nothing fits', () => {
  it('says which limit stands in the way, and what the nearest shape would need', () => {
    const limits = { maxUtilisation: 1, maxDepth: 100 }
    const { reason, nearest } = nothing({ limits, loads: { dead: 900_000 } })
    expect(reason).toBe('What stands in the way is the limit of depth, 100 mm.')
    const needed = Number(/^a depth of (\d+) mm$/.exec(nearest?.needs ?? '')?.[1])
    expect(needed).toBeGreaterThan(100)
    const given = { maxUtilisation: 1, maxDepth: needed + 1 }
    expect(found(proposeLine({ limits: given, loads: { dead: 900_000 } })).section).toBe(nearest?.section)
  })

  it('names limits that only together keep every shape out', () => {
    const { reason, nearest } = nothing({ limits: { maxUtilisation: 1, maxDepth: 60, maxWidth: 60 } })
    expect(reason).toContain('depth, 60 mm and the limit of width, 60 mm together')
    expect(nearest?.utilisation).toBeLessThanOrEqual(1)
  })

  it('says so where no shape at all is strong enough', () => {
    const { reason, nearest } = nothing({ loads: { dead: 60_000_000 } })
    expect(reason).toContain('No shape that the shop buys is strong enough')
    expect(nearest?.utilisation).toBeGreaterThan(1)
    expect(nearest?.needs).toContain('%')
  })

  it('tells a pier that is too small from a shape that is too weak', () => {
    const pier = { length: 150, width: 150 }
    const { reason } = nothing({ base: { plate: true, rods: true, concrete: { strength: 28, pier } } })
    expect(reason).toContain('pier')
  })

  it('asks for a splice where every bar is too short', () => {
    const { reason } = nothing({ height: 20_000, loads: { dead: 20_000 } })
    expect(reason).toContain('needs a splice')
  })
})
