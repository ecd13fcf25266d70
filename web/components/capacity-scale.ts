import type { CapacityDto } from '../../shared/contracts/sections.ts'

/** The chart's own units: a picture of 640 × 320 with room for its scales. */
export const CHART = { width: 640, height: 320, left: 64, right: 16, top: 12, bottom: 36 }

const ROUND = [1, 2, 2.5, 5, 10]

/** A whole, easy number not below a value, of which a few steps make the scale. */
export function niceStep(largest: number, steps: number): number {
  const rough = largest / steps
  const power = 10 ** Math.floor(Math.log10(rough))
  return (ROUND.find((one) => one * power >= rough) ?? 10) * power
}

export interface Scale {
  x: (length: number) => number
  y: (force: number) => number
  lengths: number[]
  forces: number[]
}

/** Where lengths and forces stand. `unit`: how many of the engine's units a figure of each scale holds. */
export function scaleOf(points: CapacityDto['points'], unit: { length: number; force: number }): Scale {
  const longest = points.at(-1)?.length ?? 1
  const strongest = Math.max(1, ...points.map(({ strong, weak }) => Math.max(strong, weak)))
  const [byLength, byForce] = [
    niceStep(longest / unit.length, 6) * unit.length,
    niceStep(strongest / unit.force, 5) * unit.force,
  ]
  const top = Math.ceil(strongest / byForce) * byForce
  const { width, height, left, right, bottom } = CHART
  const marks = (largest: number, step: number) =>
    Array.from({ length: Math.floor(largest / step + 1e-9) + 1 }, (_, index) => index * step)
  return {
    x: (length) => left + (length / longest) * (width - left - right),
    y: (force) => height - bottom - (force / top) * (height - CHART.top - bottom),
    lengths: marks(longest, byLength),
    forces: marks(top, byForce),
  }
}
