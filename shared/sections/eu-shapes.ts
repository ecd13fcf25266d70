import { perimeterOfBox, perimeterOfI } from './geometry.ts'
import type { ISection, Section } from './section.ts'
import type { EuHollowRow, EuIRow } from './tables.ts'

const CM = 10
const CM2 = CM ** 2
const CM3 = CM ** 3
const CM4 = CM ** 4
const CM6 = CM ** 6

/** y–y is the strong axis in the European tables. */
export function euI(row: EuIRow): ISection {
  const [designation, family, mass, h, b, tw, tf, r, A, Iy, iy, Wely, Wply, Iz, iz, Welz, Wplz, It, Iw] = row
  const ho = h - tf
  return {
    shape: 'I',
    family,
    designation,
    designationSI: designation,
    mass,
    area: A * CM2,
    depth: h,
    width: b,
    tw,
    tf,
    fillet: r,
    flangeRatio: b / (2 * tf),
    webRatio: (h - 2 * tf - 2 * r) / tw,
    Ix: Iy * CM4,
    Sx: Wely * CM3,
    rx: iy * CM,
    Zx: Wply * CM3,
    Iy: Iz * CM4,
    Sy: Welz * CM3,
    ry: iz * CM,
    Zy: Wplz * CM3,
    J: It * CM4,
    Cw: Iw * CM6,
    ho,
    rts: Math.sqrt(Math.sqrt(Iz * CM4 * Iw * CM6) / (Wely * CM3)),
    perimeter: perimeterOfI(h, b, tw, r),
  }
}

export function euHollow(row: EuHollowRow): Section {
  const [
    designation,
    family,
    process,
    mass,
    h,
    b,
    t,
    corner,
    ct,
    A,
    Iy,
    iy,
    Wely,
    Wply,
    Iz,
    iz,
    Welz,
    Wplz,
    It,
  ] = row
  const common = {
    process,
    designation,
    designationSI: designation,
    mass,
    area: A * CM2,
    depth: h,
    width: b,
    wall: t,
    designWall: t,
    Ix: Iy * CM4,
    Sx: Wely * CM3,
    rx: iy * CM,
    Zx: Wply * CM3,
    Iy: Iz * CM4,
    Sy: Welz * CM3,
    ry: iz * CM,
    Zy: Wplz * CM3,
    J: It * CM4,
  }
  if (family === 'CHS') {
    return { ...common, shape: 'round', family, diameterRatio: ct, perimeter: Math.PI * h }
  }
  return {
    ...common,
    shape: 'box',
    family,
    // EN 1993-1-1: c = b − 3t.
    widthRatio: b / t - 3,
    depthRatio: h / t - 3,
    corner: corner ?? 0,
    perimeter: perimeterOfBox(h, b, corner ?? 0),
  }
}
