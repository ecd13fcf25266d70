import { factorise, multiply, pencil, solve } from './banded.ts'
import { modelOf, type Model, type Strut } from './strut.ts'

export interface CriticalLoad {
  /** π·√(EI/Pcr), mm, Pcr being the force at the base: it does not depend on EI. */
  length: number
  /** Buckled form: [height mm, deflection], the largest deflection being +1. */
  shape: [number, number][]
}

/** Bisection stops at this relative width, far below what the elements leave open. */
const CLOSE = 1e-12
const NO_ROOT = 1e12
const SAMPLES = 40

/**
 * Smallest elastic critical load of a strut by beam elements: the least positive root λ of K − λG, found by counting
 * negative pivots and halving, which cannot miss the lowest mode. λ = Pcr·H²/EI.
 * Valid for an elastic, prismatic, straight strut without shear deformation, its braces rigid and holding translation alone.
 * The caller has refused mechanisms.
 */
export function criticalLoad(strut: Strut): CriticalLoad {
  const model = modelOf(strut)
  const lambda = lowestRoot(model)
  return { length: (Math.PI * strut.height) / Math.sqrt(lambda), shape: buckledForm(model, lambda, strut) }
}

function lowestRoot(model: Model): number {
  const below = (lambda: number): number => factorise(pencil(model.K, model.G, lambda)).negativePivots
  let low = 0
  let high = 1
  while (below(high) === 0) {
    low = high
    high *= 2
    if (high > NO_ROOT) throw new RangeError('the strut has no elastic critical load')
  }
  while (high - low > CLOSE * high) {
    const middle = (low + high) / 2
    if (middle === low || middle === high) break
    if (below(middle) === 0) low = middle
    else high = middle
  }
  return low
}

/** Inverse iteration beside the root: each turn shrinks the other modes by a factor of about 10⁻¹². */
function buckledForm(model: Model, lambda: number, strut: Strut): [number, number][] {
  const factors = factorise(pencil(model.K, model.G, lambda))
  let form = Float64Array.from({ length: model.K.size }, (_, index) => 1 + Math.sin(1 + index))
  for (let turn = 0; turn < 4; turn++) {
    form = Float64Array.from(solve(factors, multiply(model.G, form)))
    const largest = form.reduce((most, value) => Math.max(most, Math.abs(value)), 0)
    form = form.map((value) => value / largest)
  }
  const even = Array.from({ length: SAMPLES + 1 }, (_, index) => (strut.height * index) / SAMPLES)
  const heights = [...new Set([...even, ...strut.braceHeights])].sort((a, b) => a - b)
  const points = heights.map((height) => [height, deflectionAt(model, form, height / strut.height)] as const)
  const peak = points.reduce((most, [, w]) => (Math.abs(w) > Math.abs(most) ? w : most), 0)
  // Adding zero turns −0 into 0.
  return points.map(([height, w]) => [height, w / peak + 0])
}

/** Cubic between the nodes on either side. */
function deflectionAt(model: Model, form: Float64Array, at: number): number {
  const above = Math.max(
    1,
    model.nodes.findIndex((node) => node >= at),
  )
  const from = model.nodes[above - 1] ?? 0
  const l = (model.nodes[above] ?? 1) - from
  const s = (at - from) / l
  const [w1 = 0, t1 = 0, w2 = 0, t2 = 0] = form.subarray(2 * above - 2, 2 * above + 2)
  return (
    w1 * (1 - 3 * s ** 2 + 2 * s ** 3) +
    t1 * l * (s - 2 * s ** 2 + s ** 3) +
    w2 * (3 * s ** 2 - 2 * s ** 3) +
    t2 * l * (s ** 3 - s ** 2)
  )
}
