import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { z } from 'zod'
import { DEMO_SHOP } from '../seeds/demo/people.ts'
import { ConfigFault, type Config } from './config.ts'
import type { ShopDetails } from './pdf/quote-document.ts'

const shopDetails = z.strictObject({
  name: z.string().min(1),
  address: z.array(z.string().min(1)).min(1),
  phone: z.string().min(1),
  email: z.email(),
  paper: z.enum(['A4', 'Letter']),
  system: z.enum(['SI', 'US']),
})

/** What documents and mail say about the shop: `shop.json` beside the data. The demo writes its own. */
export function readShopDetails({ dataDir, mode }: Pick<Config, 'dataDir' | 'mode'>): ShopDetails {
  const file = join(dataDir, 'shop.json')
  if (!existsSync(file) && mode === 'demo') writeFileSync(file, `${JSON.stringify(DEMO_SHOP, null, 2)}\n`)
  if (!existsSync(file)) {
    throw new ConfigFault(
      `Missing: ${file} with name, address (lines), phone, email, paper, system (SI or US)`,
    )
  }
  const parsed = shopDetails.safeParse(JSON.parse(readFileSync(file, 'utf8')))
  if (!parsed.success) throw new ConfigFault(`${file}\n${z.prettifyError(parsed.error)}`)
  return parsed.data
}
