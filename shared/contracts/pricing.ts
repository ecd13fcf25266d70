import { z } from 'zod'
import { decimal, money } from './common.ts'
import { FINISHES, OVERRIDABLE } from '../pricing/line-spec.ts'

const length = z.number().positive().max(30000)
export const plateSpec = z.strictObject({
  length: z.number().positive().max(3000),
  width: z.number().positive().max(3000),
  thickness: z.number().positive().max(200),
  holes: z.strictObject({ count: z.int().min(0).max(40), diameter: z.number().min(0).max(150) }),
})
const extra = z.strictObject({
  description: z.string().trim().min(1).max(120),
  quantity: z.number().positive().max(100000),
  unitCost: decimal,
})
const override = z.strictObject({
  item: z.enum(OVERRIDABLE),
  value: decimal,
  reason: z.string().trim().min(3).max(300),
})
export const lineSpec = z.strictObject({
  mark: z.string().trim().min(1).max(20),
  quantity: z.int().min(1).max(2000),
  section: z.string().trim().min(1).max(60),
  grade: z.string().trim().min(1).max(40),
  height: length,
  finish: z.enum(FINISHES),
  base: plateSpec.nullable(),
  cap: plateSpec.nullable(),
  rods: z
    .strictObject({
      count: z.int().min(1).max(24),
      diameter: z.number().positive().max(100),
      grade: z.string().max(20),
    })
    .nullable(),
  welds: z
    .array(
      z.strictObject({
        where: z.enum(['base', 'cap']),
        leg: z.number().positive().max(50),
        length: z.number().positive().max(100000),
      }),
    )
    .max(20),
  extras: z.array(extra).max(20),
  overrides: z.array(override).max(20),
})
export type LineSpecDto = z.infer<typeof lineSpec>

/** As answered: what extras cost, and what was set by hand, is for shop eyes only. */
export const shownLineSpec = lineSpec.extend({
  extras: z.array(extra.partial({ unitCost: true })),
  overrides: z.array(override).optional(),
})
export type ShownLineSpecDto = z.infer<typeof shownLineSpec>

const overridden = z.object({ computed: decimal, reason: z.string() })

/** Shop eyes only. Costs are exact decimals; they never reach a contractor. */
export const costLine = z.object({
  key: z.string(),
  label: z.string(),
  quantity: decimal,
  unit: z.string(),
  rate: decimal,
  /** What the rate is for, such as `per kg`. */
  rateUnit: z.string(),
  cost: decimal,
  /** Where the number comes from, in words. */
  basis: z.string(),
  overridden: overridden.nullable(),
})

export const pricedLine = z.object({
  mark: z.string(),
  quantity: z.int(),
  section: z.string(),
  pieceMass: z.number(),
  unitPrice: money,
  linePrice: money,
  /** Shop only. */
  cost: z
    .object({
      lines: z.array(costLine),
      lineCost: decimal,
      contingency: decimal,
      margin: decimal,
      marginOverridden: overridden.nullable(),
      computedUnitPrice: money,
      unitPriceOverridden: overridden.nullable(),
      resultingMargin: decimal,
      belowFloor: z.boolean(),
    })
    .optional(),
})
export const pricedQuote = z.object({
  lines: z.array(pricedLine),
  delivery: z.object({ km: z.number(), trucks: z.int(), price: money, cost: decimal.optional() }),
  subtotal: money,
  tax: z.object({ rate: decimal, exempt: z.boolean(), amount: money }),
  total: money,
  deposit: money,
  mass: z.number(),
  priceBookVersion: z.int(),
  /** Shop only. */
  resultingMargin: decimal.optional(),
  warnings: z.array(z.string()).optional(),
})
export type PricedQuoteDto = z.infer<typeof pricedQuote>
