/*
 * Symmetric band matrices of the beam elements: four degrees of freedom to an element, so three entries beside the
 * diagonal. Kept by rows, lower half: row i holds columns i−3 … i.
 */
export const BAND = 3
const ROW = BAND + 1

export interface Band {
  size: number
  entries: Float64Array
}

export function band(size: number): Band {
  return { size, entries: new Float64Array(size * ROW) }
}

/** Adds to an entry of the lower half; `row` ≥ `column`. */
export function add(matrix: Band, row: number, column: number, value: number): void {
  const at = row * ROW + column - row + BAND
  matrix.entries[at] = (matrix.entries[at] ?? 0) + value
}

/** Takes a degree of freedom out: its row and column vanish, and `diagonal` stands in its place. */
export function hold(matrix: Band, index: number, diagonal: number): void {
  for (let column = Math.max(0, index - BAND); column < index; column++) {
    matrix.entries[index * ROW + column - index + BAND] = 0
  }
  for (let row = index + 1; row <= Math.min(matrix.size - 1, index + BAND); row++) {
    matrix.entries[row * ROW + index - row + BAND] = 0
  }
  matrix.entries[index * ROW + BAND] = diagonal
}

/** K − λG. */
export function pencil(K: Band, G: Band, lambda: number): Band {
  const entries = new Float64Array(K.entries.length)
  for (let at = 0; at < entries.length; at++)
    entries[at] = (K.entries[at] ?? 0) - lambda * (G.entries[at] ?? 0)
  return { size: K.size, entries }
}

export function multiply(matrix: Band, vector: Float64Array): Float64Array {
  const out = new Float64Array(matrix.size)
  for (let row = 0; row < matrix.size; row++) {
    for (let column = Math.max(0, row - BAND); column <= row; column++) {
      const value = matrix.entries[row * ROW + column - row + BAND] ?? 0
      out[row] = (out[row] ?? 0) + value * (vector[column] ?? 0)
      if (column < row) out[column] = (out[column] ?? 0) + value * (vector[row] ?? 0)
    }
  }
  return out
}

export interface Factors {
  /** L below its unit diagonal, and D on the diagonal, in the place of the matrix. */
  band: Band
  /** By Sylvester's law of inertia: how many eigenvalues of the pencil lie below λ. */
  negativePivots: number
}

/** LDLᵀ without exchange of rows. A pivot that vanishes is moved by a hair, which moves λ by as little. */
export function factorise(matrix: Band): Factors {
  const out = band(matrix.size)
  const { entries } = out
  let negativePivots = 0
  for (let row = 0; row < matrix.size; row++) {
    const first = Math.max(0, row - BAND)
    const diagonal = matrix.entries[row * ROW + BAND] ?? 0
    let pivot = diagonal
    for (let column = first; column < row; column++) {
      let value = matrix.entries[row * ROW + column - row + BAND] ?? 0
      for (let k = Math.max(first, column - BAND); k < column; k++) {
        const lRow = entries[row * ROW + k - row + BAND] ?? 0
        const lColumn = entries[column * ROW + k - column + BAND] ?? 0
        value -= lRow * lColumn * (entries[k * ROW + BAND] ?? 0)
      }
      const factor = value / (entries[column * ROW + BAND] ?? 1)
      entries[row * ROW + column - row + BAND] = factor
      pivot -= factor * value
    }
    if (pivot === 0) pivot = (Math.abs(diagonal) || 1) * Number.EPSILON
    entries[row * ROW + BAND] = pivot
    if (pivot < 0) negativePivots++
  }
  return { band: out, negativePivots }
}

export function solve(factors: Factors, right: Float64Array): Float64Array {
  const { size, entries } = factors.band
  const x = right.slice()
  for (let row = 0; row < size; row++) {
    for (let column = Math.max(0, row - BAND); column < row; column++) {
      x[row] = (x[row] ?? 0) - (entries[row * ROW + column - row + BAND] ?? 0) * (x[column] ?? 0)
    }
  }
  for (let row = 0; row < size; row++) x[row] = (x[row] ?? 0) / (entries[row * ROW + BAND] ?? 1)
  for (let row = size - 1; row >= 0; row--) {
    for (let below = row + 1; below <= Math.min(size - 1, row + BAND); below++) {
      x[row] = (x[row] ?? 0) - (entries[below * ROW + row - below + BAND] ?? 0) * (x[below] ?? 0)
    }
  }
  return x
}
