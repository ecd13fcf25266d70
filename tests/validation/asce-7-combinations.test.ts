import { describe, expect, it } from 'vitest'
import { combine, extremes } from '../../shared/standards/asce7/combine.ts'
import { completeLoads } from '../../shared/standards/asce7/loads.ts'

/*
 * Basic combinations of ASCE/SEI 7 for strength and allowable stress design, against a separate program written from the
 * standard alone. kip; tolerance 1e-6.
 */

function worst(edition: 'ASCE 7-22' | 'ASCE 7-16', method: 'LRFD' | 'ASD', f1: number, loads: object) {
  const [first, ...rest] = combine(completeLoads(loads), edition, method, f1)
  if (!first) throw new Error('no combination')
  return extremes([first, ...rest])
}

describe('ASCE 7-16: an office column, wind both ways', () => {
  const loads = { dead: 60, live: 90, roofLive: 12, snow: 25, wind: { pushes: 18, lifts: 30 } }
  it('LRFD: 1.2D + 1.6L + 0.5S is 228.5 kip, no uplift', () => {
    const { compression, compressionBy, uplift } = worst('ASCE 7-16', 'LRFD', 0.5, loads)
    expect(compression).toBeCloseTo(228.5, 6)
    expect(compressionBy.name).toBe('1.2D+1.6L+0.5S')
    expect(uplift).toBe(0)
  })
  it('ASD: D + 0.75L + 0.45W + 0.75S is 154.35 kip, no uplift', () => {
    const { compression, compressionBy, uplift } = worst('ASCE 7-16', 'ASD', 0.5, loads)
    expect(compression).toBeCloseTo(154.35, 6)
    expect(compressionBy.name).toBe('D+0.75L+0.75S+0.45W')
    expect(uplift).toBe(0)
  })
})

describe('ASCE 7-22: a light roof column with net uplift', () => {
  const loads = {
    ...{ dead: 8, roofLive: 10, snow: 18, rain: 3 },
    wind: { pushes: 5, lifts: 19 },
    earthquake: { pushes: 7, lifts: 7, vertical: 0.8 },
  }
  it('LRFD: 30.1 kip by 1.2D + S + 0.5W, uplift 11.8 kip by 0.9D − W', () => {
    const { compression, compressionBy, uplift, upliftBy } = worst('ASCE 7-22', 'LRFD', 1, loads)
    expect(compression).toBeCloseTo(30.1, 6)
    expect(compressionBy.name).toBe('1.2D+S+0.5W')
    expect(uplift).toBeCloseTo(11.8, 6)
    expect(upliftBy.name).toBe('0.9D−W')
  })
  it('ASD: 20.6 kip by D + 0.7S, uplift 6.6 kip by 0.6D − 0.6W', () => {
    const { compression, compressionBy, uplift, upliftBy } = worst('ASCE 7-22', 'ASD', 1, loads)
    expect(compression).toBeCloseTo(20.6, 6)
    expect(compressionBy.name).toBe('D+0.7S')
    expect(uplift).toBeCloseTo(6.6, 6)
    expect(upliftBy.name).toBe('0.6D−0.6W')
  })
})
