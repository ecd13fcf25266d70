import type { LineSpec, OVERRIDABLE } from './line-spec.ts'
import type { Money } from './money.ts'
import type { NestResult, NestStock } from './nesting.ts'
import type { PricedSection } from './take-off.ts'

/** One row of the cost sheet. Decimals as text; costs in currency units. */
export interface CostLine {
  key: string
  label: string
  quantity: string
  unit: string
  rate: string
  /** What the rate is for, such as `per kg`; minutes are charged by the hour. */
  rateUnit: string
  cost: string
  /** Where the number comes from, in words. */
  basis: string
  /** `computed` is the quantity (minutes) that stood there before. */
  overridden: Overridden | null
}

export interface Overridden {
  computed: string
  reason: string
}

export interface LineCost {
  lines: CostLine[]
  lineCost: string
  /** Fractions. */
  contingency: string
  margin: string
  marginOverridden: Overridden | null
  /** What the price would be with no unit price set by hand. */
  computedUnitPrice: Money
  unitPriceOverridden: Overridden | null
  /** What the price earns on the cost with its contingency: 1 − cost × (1 + contingency) ÷ price. */
  resultingMargin: string
  belowFloor: boolean
}

export interface PricedLine {
  mark: string
  quantity: number
  section: string
  /** kg */
  pieceMass: number
  unitPrice: Money
  linePrice: Money
  cost: LineCost
}

/** Bars of one section and grade, for all lines that are cut from it. */
export interface SteelPlan {
  section: string
  grade: string
  stock: NestStock[]
  nest: NestResult
  /** Bars less what is left, currency units. */
  netCost: string
}

export interface PricedQuote {
  lines: PricedLine[]
  delivery: { km: number; trucks: number; price: Money; cost: string }
  /** Sum of the lines. */
  subtotal: Money
  /** On lines and delivery. */
  tax: { rate: string; exempt: boolean; amount: Money }
  total: Money
  deposit: Money
  /** kg of all pieces. */
  mass: number
  priceBookVersion: number
  /** Of lines and delivery together. */
  resultingMargin: string
  warnings: string[]
  steel: SteelPlan[]
}

/** A line to price: how it is made, and the shape it is made from. */
export interface LineToPrice {
  spec: LineSpec
  section: PricedSection
}

/** A piece of bar in the shop's rack, at book value (currency units each). */
export interface RackBar {
  section: string
  grade: string
  length: number
  bookValue: string
  count: number
}

export type OverridableItem = (typeof OVERRIDABLE)[number]
