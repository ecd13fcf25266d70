import type { PricedQuoteDto } from '../../../shared/contracts/pricing.ts'

/** What a customer may see of a price: cost, margin and what the engine warns the shop of stay here. */
export function priceForCustomer(price: PricedQuoteDto): PricedQuoteDto {
  const { lines, delivery, subtotal, tax, total, deposit, mass, priceBookVersion } = price
  const { km, trucks, price: carried } = delivery
  return {
    lines: lines.map(({ mark, quantity, section, pieceMass, unitPrice, linePrice }) => ({
      ...{ mark, quantity, section, pieceMass, unitPrice, linePrice },
    })),
    delivery: { km, trucks, price: carried },
    ...{ subtotal, tax, total, deposit, mass, priceBookVersion },
  }
}
