import { KG_M_PER_LB_FT, MM_PER_INCH as IN } from '../units/convert.ts'
import { perimeterOfBox, perimeterOfI, ring } from './geometry.ts'
import type { BoxSection, ISection, RoundSection } from './section.ts'
import type { UsBoxRow, UsIRow, UsRoundRow } from './tables.ts'

/*
 * US shapes are computed from the US columns alone (the SI columns are printed to three figures), and weighed from lb/ft
 * (the metric mass in the name of a W shape is up to 2.8 % off it).
 */
const IN2 = IN ** 2
const IN3 = IN ** 3
const IN4 = IN ** 4
const IN6 = IN ** 6

export function usI(row: UsIRow): ISection {
  const [
    designation,
    designationSI,
    lbft,
    A,
    d,
    bf,
    tw,
    tf,
    fillet,
    bf2tf,
    htw,
    Ix,
    Sx,
    rx,
    Zx,
    Iy,
    Sy,
    ry,
    Zy,
    J,
    Cw,
    rts,
    ho,
  ] = row
  return {
    shape: 'I',
    family: 'W',
    designation,
    designationSI,
    mass: lbft * KG_M_PER_LB_FT,
    area: A * IN2,
    depth: d * IN,
    width: bf * IN,
    tw: tw * IN,
    tf: tf * IN,
    fillet: fillet * IN,
    flangeRatio: bf2tf,
    webRatio: htw,
    Ix: Ix * IN4,
    Sx: Sx * IN3,
    rx: rx * IN,
    Zx: Zx * IN3,
    Iy: Iy * IN4,
    Sy: Sy * IN3,
    ry: ry * IN,
    Zy: Zy * IN3,
    J: J * IN4,
    Cw: Cw * IN6,
    rts: rts * IN,
    ho: ho * IN,
    perimeter: perimeterOfI(d, bf, tw, fillet) * IN,
  }
}

/** ASTM A500: properties by the design wall, weight by the nominal one; outside corner radius 2.0 × nominal wall for drawing and painting. */
export function usBox(family: 'HSS_SQUARE' | 'HSS_RECT'): (row: UsBoxRow) => BoxSection {
  return (row) => {
    const [
      designation,
      designationSI,
      lbft,
      H,
      B,
      wall,
      design,
      A,
      bt,
      ht,
      Ix,
      Sx,
      rx,
      Zx,
      Iy,
      Sy,
      ry,
      Zy,
      J,
    ] = row
    return {
      shape: 'box',
      family,
      process: 'A500',
      designation,
      designationSI,
      mass: lbft * KG_M_PER_LB_FT,
      area: A * IN2,
      depth: H * IN,
      width: B * IN,
      wall: wall * IN,
      designWall: design * IN,
      widthRatio: bt,
      depthRatio: ht,
      corner: 2 * wall * IN,
      Ix: Ix * IN4,
      Sx: Sx * IN3,
      rx: rx * IN,
      Zx: Zx * IN3,
      Iy: Iy * IN4,
      Sy: Sy * IN3,
      ry: ry * IN,
      Zy: Zy * IN3,
      J: J * IN4,
      perimeter: perimeterOfBox(H, B, 2 * wall) * IN,
    }
  }
}

function usRing(row: UsRoundRow, family: 'HSS_ROUND' | 'PIPE', process: 'A500' | 'A53'): RoundSection {
  const [designation, designationSI, lbft, D, wall, design, A, Dt, I, S, r, Z, J] = row
  return {
    shape: 'round',
    family,
    process,
    designation,
    designationSI,
    mass: lbft * KG_M_PER_LB_FT,
    area: A * IN2,
    depth: D * IN,
    width: D * IN,
    wall: wall * IN,
    designWall: design * IN,
    diameterRatio: Dt,
    Ix: I * IN4,
    Sx: S * IN3,
    rx: r * IN,
    Zx: Z * IN3,
    Iy: I * IN4,
    Sy: S * IN3,
    ry: r * IN,
    Zy: Z * IN3,
    J: J * IN4,
    perimeter: Math.PI * D * IN,
  }
}

export function usRound(row: UsRoundRow): RoundSection {
  return usRing(row, 'HSS_ROUND', 'A500')
}

/**
 * Pipe. Some published values contradict their own diameter and wall (Pipe10STD: area 3.4 % too large; Pipe14XS and above:
 * 3 % too small), so the smaller of the published and the geometric value counts, for A, I, Z, J, and S by the same ratio.
 */
export function usPipe(row: UsRoundRow): RoundSection {
  const published = usRing(row, 'PIPE', 'A53')
  const geometric = ring(published.depth, published.designWall)
  const area = Math.min(published.area, geometric.area)
  const I = Math.min(published.Ix, geometric.I)
  const Z = Math.min(published.Zx, geometric.Z)
  const S = Math.min(published.Sx, (2 * geometric.I) / published.depth)
  const J = Math.min(published.J, 2 * geometric.I)
  return { ...published, area, Ix: I, Iy: I, Zx: Z, Zy: Z, Sx: S, Sy: S, J }
}
