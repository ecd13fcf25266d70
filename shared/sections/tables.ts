/* Rows of the published tables as they are kept in seeds/reference/sections; each table says its columns. */

type Seventeen = [
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
]

/** designation, SI designation, lb/ft, A in², d, bf, tw, tf, fillet in, bf/2tf, h/tw, Ix, Sx, rx, Zx, Iy, Sy, ry, Zy, J, Cw, rts, ho (in, in³, in⁴, in⁶). */
export type UsIRow = readonly [string, string, ...Seventeen, number, number, number, number]

/** designation, SI designation, lb/ft, H, B, nominal wall, design wall in, A in², b/t, h/t, Ix, Sx, rx, Zx, Iy, Sy, ry, Zy, J (in, in³, in⁴). */
export type UsBoxRow = readonly [string, string, ...Seventeen]

/** designation, SI designation, lb/ft, D, nominal wall, design wall in, A in², D/t, I, S, r, Z, J (in, in³, in⁴). */
export type UsRoundRow = readonly [
  string,
  string,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
  number,
]

/** designation, family, kg/m, h, b, tw, tf, r mm, A cm², Iy cm⁴, iy cm, Wel,y, Wpl,y cm³, Iz cm⁴, iz cm, Wel,z, Wpl,z cm³, It cm⁴, Iw cm⁶. */
export type EuIRow = readonly [string, 'HEA' | 'HEB' | 'HEM' | 'IPE' | 'UC' | 'UB', ...Seventeen]

/** designation, type, process, kg/m, h, b, t, outside corner mm, c/t, A cm², Iy cm⁴, iy cm, Wel,y, Wpl,y cm³, Iz cm⁴, iz cm, Wel,z, Wpl,z cm³, It cm⁴. */
export type EuHollowRow = readonly [
  string,
  'SHS' | 'RHS' | 'CHS',
  'hot finished' | 'cold formed',
  number,
  number,
  number,
  number,
  number | null,
  ...[number, number, number, number, number, number, number, number, number, number, number],
]
