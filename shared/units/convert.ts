/*
 * Exact factors of the international yard and pound agreement (1959): 1 in = 25.4 mm, 1 lb = 0.45359237 kg,
 * and of standard gravity 9.80665 m/s² for the pound-force.
 */
export const MM_PER_INCH = 25.4
export const N_PER_KIP = 4448.2216152605
export const MPA_PER_KSI = N_PER_KIP / MM_PER_INCH ** 2
export const KG_PER_LB = 0.45359237
/** Pound-force. */
export const N_PER_LB = N_PER_KIP / 1000
export const KG_M_PER_LB_FT = KG_PER_LB / 0.3048

declare const unit: unique symbol
/** A number that knows its unit: lengths and forces do not mix by accident. */
export type Branded<U extends string> = number & { readonly [unit]: U }
export type Millimetres = Branded<'mm'>
export type Newtons = Branded<'N'>
export type Megapascals = Branded<'MPa'>

export function mm(value: number): Millimetres {
  return value as Millimetres
}
export function newtons(value: number): Newtons {
  return value as Newtons
}
export function inches(value: number): Millimetres {
  return (value * MM_PER_INCH) as Millimetres
}
export function feet(value: number): Millimetres {
  return (value * 12 * MM_PER_INCH) as Millimetres
}
export function kips(value: number): Newtons {
  return (value * N_PER_KIP) as Newtons
}
export function ksi(value: number): Megapascals {
  return (value * MPA_PER_KSI) as Megapascals
}
