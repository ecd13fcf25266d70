import type { PricedQuoteDto } from '../../../shared/contracts/pricing.ts'
import { moneyNumber } from '../../format/money.ts'

const PART_OF: Record<string, string> = {
  shaftSteel: 'Shaft',
  plateSteel: 'Plate',
  rods: 'Rods',
  sawing: 'Work',
  plateCutting: 'Work',
  drilling: 'Work',
  welding: 'Work',
  fitting: 'Work',
  finish: 'Finish',
  finishMinimum: 'Finish',
  drawing: 'Drawing',
}

/** A line's price cut into its parts; what is left above the costs is contingency and margin. For the eye only. */
export function costParts(line: PricedQuoteDto['lines'][number]): { name: string; amount: number }[] {
  if (!line.cost) return []
  const parts = new Map<string, number>()
  for (const { key, cost } of line.cost.lines) {
    const name = PART_OF[key] ?? 'Extras'
    parts.set(name, (parts.get(name) ?? 0) + Number(cost))
  }
  const above = moneyNumber(line.linePrice) - Number(line.cost.lineCost)
  return [
    ...[...parts].map(([name, amount]) => ({ name, amount })),
    { name: 'Contingency and margin', amount: above },
  ]
}
