import type { EndCondition } from '../../../shared/stability/column.ts'

export interface BucklingCase {
  name: string
  /** mm. */
  height: number
  /** N·mm². */
  EI: number
  bottom: EndCondition
  top: EndCondition
  /** Rotational spring at the base instead of its condition, N·mm/rad. */
  baseSpring?: number
  braces: number[]
  /** [height mm, share of the base force]; all at the top where left out. */
  loads?: [number, number][]
  /** Critical force at the base with ideally rigid ends, N. */
  Pcr: number
  /** Eigenvalue length with fixed ends softened as the recommended K implies, mm. */
  softened: number
  /** Largest K·L of the parts that have a K of their own, mm: theoretical and recommended; left out for loads at several heights. */
  segment?: [number, number]
  /** Buckled form at a quarter, half and three quarters of the height, largest value ±1. */
  form: [number, number, number]
}

// prettier-ignore
export const BUCKLING_CASES: readonly BucklingCase[] = [
  { name: 'pin-pin plain', height: 4200, EI: 3397418666666.6665, bottom: 'pinned', top: 'pinned', braces: [], Pcr: 1900860.44, softened: 4200, segment: [4200, 4200], form: [0.7071, 1.0, 0.7071] },
  { name: 'fixed base, pinned top', height: 5100, EI: 2392934400000, bottom: 'fixed', top: 'pinned', braces: [], Pcr: 1857558.21, softened: 4079.975, segment: [3570, 4080], form: [0.3704, 0.9292, 0.8393] },
  { name: 'fixed both ends', height: 3600, EI: 610065333333.3333, bottom: 'fixed', top: 'fixed', braces: [], Pcr: 1858365.28, softened: 2339.9691, segment: [1800, 2340], form: [0.5, 1.0, 0.5] },
  { name: 'cantilever', height: 3300, EI: 2298718267196.7563, bottom: 'fixed', top: 'free', braces: [], Pcr: 520831.954, softened: 6929.9948, segment: [6600, 6930], form: [0.0761, 0.2929, 0.6173] },
  { name: 'fixed base, sliding top', height: 4500, EI: 8743600800000, bottom: 'fixed', top: 'guided', braces: [], Pcr: 4261524.98, softened: 5400.0842, segment: [4500, 5400], form: [0.1464, 0.5, 0.8536] },
  { name: 'pinned base, sliding top', height: 4800, EI: 58548763733333.336, bottom: 'pinned', top: 'guided', braces: [], Pcr: 6270107.81, softened: 9600, segment: [9600, 9600], form: [0.3827, 0.7071, 0.9239] },
  { name: 'one brace at mid-height', height: 7000, EI: 1499032833333.3335, bottom: 'pinned', top: 'pinned', braces: [3500], Pcr: 1207743.76, softened: 3500, segment: [3500, 3500], form: [1.0, 0.0, -1.0] },
  { name: 'one brace off centre', height: 6500, EI: 3397418666666.6665, bottom: 'pinned', top: 'pinned', braces: [4030], Pcr: 2882453.64, softened: 3410.6978, segment: [4030, 4030], form: [0.9805, 0.4705, -0.2836] },
  { name: 'two braces unequal', height: 8400, EI: 1750219200000, bottom: 'pinned', top: 'pinned', braces: [2100, 5460], Pcr: 2059555.67, softened: 2896.0718, segment: [3360, 3360], form: [0.0, -0.956, 0.7759] },
  { name: 'four braces unequal', height: 12000, EI: 1499032833333.3335, bottom: 'pinned', top: 'pinned', braces: [1200, 4200, 6600, 10800], Pcr: 1907306.16, softened: 2785.1285, segment: [4200, 4200], form: [0.2371, -0.2783, 0.9271] },
  { name: 'fixed base, balanced spans', height: 7200, EI: 2392934400000, bottom: 'fixed', top: 'pinned', braces: [4237.4], Pcr: 2690817.19, softened: 3186.0924, segment: [2966.18, 3389.92], form: [0.7985, 0.5658, -0.8413] },
  { name: 'brace close above fixed base', height: 6000, EI: 6558238812584.844, bottom: 'fixed', top: 'pinned', braces: [60], Pcr: 3734058.62, softened: 4164.7075, segment: [5940, 5940], form: [0.3564, 0.924, 0.8434] },
  { name: 'brace close below pinned top', height: 6200, EI: 8743600800000, bottom: 'fixed', top: 'pinned', braces: [6090], Pcr: 9196013.09, softened: 3520.7017, segment: [4263, 4872], form: [0.5095, 0.9996, 0.4716] },
  { name: 'fixed both ends, two braces unequal', height: 9000, EI: 3397418666666.6665, bottom: 'fixed', top: 'fixed', braces: [2600, 5200], Pcr: 5520305.94, softened: 2712.4486, segment: [2660, 3040], form: [0.1485, -0.5028, 0.9995] },
  { name: 'fixed both ends, brace at mid', height: 8000, EI: 1515707733333.3335, bottom: 'fixed', top: 'fixed', braces: [4000], Pcr: 1912702.71, softened: 3199.9804, segment: [2800, 3200], form: [0.9292, -0.0, -0.9292] },
  { name: 'cantilever braced at mid-height', height: 6000, EI: 18464000000000, bottom: 'fixed', top: 'free', braces: [3000], Pcr: 3213666.4, softened: 7725.6181, segment: [2100, 2400], form: [-0.0535, 0.0, 0.3831] },
  { name: 'pinned base, free third above brace', height: 4500, EI: 6558238812584.844, bottom: 'pinned', top: 'free', braces: [3000], Pcr: 2368857.98, softened: 5227.2585, segment: [3000, 3000], form: [-0.268, -0.2531, 0.2021] },
  { name: 'short free top above two braces', height: 8600, EI: 3397418666666.6665, bottom: 'pinned', top: 'free', braces: [3800, 7600], Pcr: 1480706.89, softened: 4758.7168, segment: [3800, 3800], form: [0.4053, -0.2259, -0.6504] },
  { name: 'base plate spring, one brace', height: 6600, EI: 8743600800000, bottom: 'pinned', top: 'pinned', baseSpring: 3974364000, braces: [2900], Pcr: 8169095.3, softened: 3250.1848, form: [-0.4426, 0.2749, 0.9964] },
  { name: 'two floors of load, braced at the floor', height: 7600, EI: 8743600800000, bottom: 'fixed', top: 'pinned', braces: [3900], loads: [[7600, 0.4], [3900, 0.6]], Pcr: 12945536, softened: 2852.0639, form: [0.9231, 0.0934, -0.9603] },
  { name: 'pair A strong axis', height: 9600, EI: 17700883333333.336, bottom: 'pinned', top: 'pinned', braces: [], Pcr: 1895624.09, softened: 9600, segment: [9600, 9600], form: [0.7071, 1.0, 0.7071] },
  { name: 'pair A weak axis', height: 9600, EI: 1499032833333.3335, bottom: 'pinned', top: 'pinned', braces: [2500, 5900], Pcr: 1305788.48, softened: 3366.0381, segment: [3700, 3700], form: [0.0356, -0.5461, 0.8598] },
  { name: 'pair B strong axis', height: 11000, EI: 61671948800000, bottom: 'fixed', top: 'pinned', braces: [5500], Pcr: 26054469.8, softened: 5021.7703, segment: [5500, 5500], form: [-0.4125, -0.0, 0.996] },
  { name: 'pair B weak axis', height: 11000, EI: 5535860400000, bottom: 'pinned', top: 'pinned', braces: [2200, 4700, 8300], Pcr: 6494805.28, softened: 2900.4098, segment: [3600, 3600], form: [-0.1831, 0.567, 0.0424] },
]
