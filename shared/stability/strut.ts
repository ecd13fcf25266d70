import { add, band, hold, type Band } from './banded.ts'

export interface StrutEnd {
  holdsTranslation: boolean
  /** Rotational stiffness over EI, 1/mm: 0 turns freely, `Infinity` cannot turn. */
  rotation: number
}

/** A straight prismatic strut about one axis, as the eigenvalue method sees it. mm. */
export interface Strut {
  height: number
  bottom: StrutEnd
  top: StrutEnd
  /** Points held sideways; rotation stays free. */
  braceHeights: readonly number[]
  /** Axial loads by height, as shares of the force at the base. All at the top where left out. */
  loads?: readonly { height: number; share: number }[]
}

/** Beam elements of a strut of unit height and unit EI: stiffness K, geometric stiffness G for a unit force at the base. */
export interface Model {
  /** Node heights over the strut's height. */
  nodes: number[]
  K: Band
  G: Band
}

/** Eight elements to a part between nodes that matter give 0.1 % in every known case; too few err on the unsafe side. */
const ELEMENTS_PER_PART = 8
/** Two points closer than this share of the height are one. */
const SAME = 1e-9

function nodesOf(points: readonly number[]): number[] {
  const sorted = [...points]
    .sort((a, b) => a - b)
    .filter((at, i, all) => i === 0 || at - (all[i - 1] ?? 0) > SAME)
  const nodes = [0]
  for (const [index, to] of sorted.slice(1).entries()) {
    const from = sorted[index] ?? 0
    for (let part = 1; part < ELEMENTS_PER_PART; part++) {
      nodes.push(from + ((to - from) * part) / ELEMENTS_PER_PART)
    }
    nodes.push(to)
  }
  return nodes
}

/** Cubic (Hermite) beam element: bending stiffness for EI = 1, geometric stiffness for axial force N = 1; DOFs w, w′ at both ends. */
function addElement(model: Model, first: number, length: number, force: number): void {
  const l = length
  const bending = [[12], [6 * l, 4 * l * l], [-12, -6 * l, 12], [6 * l, 2 * l * l, -6 * l, 4 * l * l]]
  const geometric = [[36], [3 * l, 4 * l * l], [-36, -3 * l, 36], [3 * l, -l * l, -3 * l, 4 * l * l]]
  for (let i = 0; i < 4; i++) {
    for (let j = 0; j <= i; j++) {
      add(model.K, first + i, first + j, (bending[i]?.[j] ?? 0) / l ** 3)
      add(model.G, first + i, first + j, ((geometric[i]?.[j] ?? 0) * force) / (30 * l))
    }
  }
}

function holdFreedom(model: Model, index: number): void {
  hold(model.K, index, 1)
  hold(model.G, index, 0)
}

export function modelOf(strut: Strut): Model {
  const loads = strut.loads ?? [{ height: strut.height, share: 1 }]
  const braces = strut.braceHeights.map((at) => at / strut.height)
  const loaded = loads.map((load) => ({ at: load.height / strut.height, share: load.share }))
  const nodes = nodesOf([0, ...braces, ...loaded.map((load) => load.at), 1])
  const size = 2 * nodes.length
  const model: Model = { nodes, K: band(size), G: band(size) }

  for (let index = 0; index + 1 < nodes.length; index++) {
    const from = nodes[index] ?? 0
    const to = nodes[index + 1] ?? 0
    const force = loaded.reduce((sum, load) => (load.at > to - SAME ? sum + load.share : sum), 0)
    addElement(model, 2 * index, to - from, force)
  }

  for (const [end, index] of [
    [strut.bottom, 0],
    [strut.top, nodes.length - 1],
  ] as const) {
    if (Number.isFinite(end.rotation)) add(model.K, 2 * index + 1, 2 * index + 1, end.rotation * strut.height)
    else holdFreedom(model, 2 * index + 1)
    if (end.holdsTranslation) holdFreedom(model, 2 * index)
  }
  for (const [index, at] of nodes.entries()) {
    if (braces.some((brace) => Math.abs(brace - at) <= SAME)) holdFreedom(model, 2 * index)
  }
  return model
}
