import type { Issue } from '../../units/refusal.ts'

/** Loads of a column by case, N. Gravity loads press; wind and earthquake are magnitudes each way. */
export interface LoadCases {
  dead: number
  live: number
  roofLive: number
  snow: number
  rain: number
  wind: { pushes: number; lifts: number }
  earthquake: { pushes: number; lifts: number; vertical: number }
}

/** As asked: what is left out is zero. */
export interface LoadsAsked {
  dead?: number | undefined
  live?: number | undefined
  roofLive?: number | undefined
  snow?: number | undefined
  rain?: number | undefined
  wind?: { pushes?: number | undefined; lifts?: number | undefined } | undefined
  earthquake?:
    { pushes?: number | undefined; lifts?: number | undefined; vertical?: number | undefined } | undefined
}

/** N; a column of this desk carries less than this by far. */
export const LARGEST_LOAD = 1e9

export function completeLoads(asked: LoadsAsked): LoadCases {
  const { wind = {}, earthquake = {} } = asked
  return {
    dead: asked.dead ?? 0,
    live: asked.live ?? 0,
    roofLive: asked.roofLive ?? 0,
    snow: asked.snow ?? 0,
    rain: asked.rain ?? 0,
    wind: { pushes: wind.pushes ?? 0, lifts: wind.lifts ?? 0 },
    earthquake: {
      pushes: earthquake.pushes ?? 0,
      lifts: earthquake.lifts ?? 0,
      vertical: earthquake.vertical ?? 0,
    },
  }
}

/** Every load with its path. */
function entries(loads: LoadCases): [path: string, value: number][] {
  const { wind, earthquake } = loads
  return [
    ['dead', loads.dead],
    ['live', loads.live],
    ['roofLive', loads.roofLive],
    ['snow', loads.snow],
    ['rain', loads.rain],
    ['wind.pushes', wind.pushes],
    ['wind.lifts', wind.lifts],
    ['earthquake.pushes', earthquake.pushes],
    ['earthquake.lifts', earthquake.lifts],
    ['earthquake.vertical', earthquake.vertical],
  ]
}

/**
 * What cannot be taken in a set of loads. Negative gravity loads are refused, not combined: the combinations of ASCE 7
 * suppose that they press, and a lifting one would relieve the column where it must not.
 */
export function loadIssues(loads: LoadCases): Issue[] {
  const issues = entries(loads).flatMap(([name, value]): Issue[] => {
    const path = `loads.${name}`
    if (!Number.isFinite(value)) return [{ path, message: 'a load is a finite number of newtons' }]
    if (value > LARGEST_LOAD) return [{ path, message: 'a load is at most 1 000 000 kN' }]
    if (value >= 0) return []
    const message = name.includes('.')
      ? 'wind and earthquake are magnitudes, 0 or more, each way by itself'
      : 'a gravity load presses and is 0 or more; give uplift as loads.wind.lifts, loads.earthquake.lifts or a negative required.axial'
    return [{ path, message }]
  })
  if (issues.length > 0 || entries(loads).some(([, value]) => value > 0)) return issues
  return [{ path: 'loads', message: 'every load is zero; give at least one load that is more than 0' }]
}
