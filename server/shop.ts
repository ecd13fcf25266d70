import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { z } from 'zod'
import { DEMO_SHOP } from '../seeds/demo/shop.ts'
import { ConfigFault, type Config } from './config.ts'

const decimalText = z.string().regex(/^\d+(\.\d+)?$/, 'a decimal number such as 0.0725')
const shop = z.strictObject({
  name: z.string().min(1),
  address: z.array(z.string().min(1)).min(1),
  phone: z.string().min(1),
  email: z.email(),
  paper: z.enum(['A4', 'Letter']),
  system: z.enum(['SI', 'US']),
  /** Where it delivers to, with the rate of tax there as a fraction. */
  taxRegions: z.array(z.strictObject({ region: z.string().min(1), rate: decimalText })),
  /** Above this total a second person approves; null: no limit. In units of the price book's currency. */
  approvalLimit: decimalText.nullable(),
})
export type Shop = z.infer<typeof shop>

/** The shop's own facts: `shop.json` beside the data. The demo writes its own the first time. */
export function readShop({ dataDir, mode }: Pick<Config, 'dataDir' | 'mode'>): Shop {
  const file = join(dataDir, 'shop.json')
  if (!existsSync(file)) {
    if (mode !== 'demo') throw new ConfigFault(`Missing: ${file}; README.md shows one`)
    writeFileSync(file, `${JSON.stringify(DEMO_SHOP, null, 2)}\n`)
  }
  const parsed = shop.safeParse(JSON.parse(readFileSync(file, 'utf8')))
  if (!parsed.success) throw new ConfigFault(`${file}\n${z.prettifyError(parsed.error)}`)
  return parsed.data
}

/** The tax rate of a region, in any case; undefined where the shop has none on file. */
export function taxRateOf({ taxRegions }: Shop, region: string): string | undefined {
  const wanted = region.trim().toLowerCase()
  return taxRegions.find((one) => one.region.toLowerCase() === wanted)?.rate
}
