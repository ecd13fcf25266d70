import type { PricedQuoteDto } from '../../../shared/contracts/pricing.ts'
import { OVERRIDABLE } from '../../../shared/pricing/line-spec.ts'
import { moneyFigures } from '../../format/money.ts'

export type ByHandItem = (typeof OVERRIDABLE)[number]
type LineCost = NonNullable<PricedQuoteDto['lines'][number]['cost']>

export const BY_HAND_WORDS: Record<ByHandItem, string> = {
  'minutes.sawing': 'Sawing',
  'minutes.plateCutting': 'Plate cutting',
  'minutes.drilling': 'Drilling',
  'minutes.welding': 'Welding',
  'minutes.fitting': 'Fitting and handling',
  margin: 'Margin',
  unitPrice: 'Price each',
}
export const BY_HAND_ITEMS: readonly ByHandItem[] = OVERRIDABLE

/** What the desk reckons for an item, set by hand or not: where its own figure starts and what it stands beside. */
export function computedOf(item: ByHandItem, cost: LineCost | undefined): string {
  if (!cost) return ''
  if (item === 'margin') return cost.marginOverridden?.computed ?? cost.margin
  if (item === 'unitPrice') {
    return cost.unitPriceOverridden?.computed ?? moneyFigures(cost.computedUnitPrice).replaceAll(',', '')
  }
  const line = cost.lines.find(({ key }) => `minutes.${key}` === item)
  return line?.overridden?.computed ?? line?.quantity ?? '0'
}
