import { readFileSync } from 'node:fs'
import { price } from '../pricing/price.ts'
import { secret } from '../../server/modules/a/a.repo.ts'
export const length = () => readFileSync(price + secret)
