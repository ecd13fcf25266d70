import { decimalText, exact, settled, sum, ZERO, type Exact } from './exact.ts'
import { rodPriceOf, type LinearMinutes, type PriceBook } from './price-book.ts'
import type { CostLine, OverridableItem } from './priced-quote.ts'
import type { LineWithTakeOff, SteelShare } from './steel-cost.ts'
import { size } from './take-off.ts'

/** A cost line with its numbers still exact, and its words only when somebody reads them: screening does not. */
export interface ExactCostLine extends Omit<
  CostLine,
  'label' | 'cost' | 'quantity' | 'rate' | 'basis' | 'overridden'
> {
  label: () => string
  quantity: Exact
  rate: Exact
  cost: Exact
  basis: () => string
  overridden: { computed: Exact; reason: string } | null
}

export function readable(line: ExactCostLine): CostLine {
  const { overridden } = line
  return {
    ...line,
    label: line.label(),
    quantity: decimalText(line.quantity),
    rate: decimalText(line.rate),
    cost: decimalText(line.cost),
    basis: line.basis(),
    overridden: overridden && { ...overridden, computed: decimalText(overridden.computed) },
  }
}

type Row = Omit<ExactCostLine, 'cost' | 'overridden'>

/** Every cost line of a line but the share of the order's least finish charge. Lines that cost nothing are left out. */
export function costLines(book: PriceBook, line: LineWithTakeOff, steel: SteelShare): ExactCostLine[] {
  const rows = [
    ...materials(book, line, steel),
    ...labour(book, line, steel),
    ...finish(book, line),
    drawing(book),
    ...extras(line),
  ]
  return rows.filter(({ cost, overridden }) => !cost.isZero() || overridden)
}

function costed(row: Row): ExactCostLine {
  return { ...row, cost: settled(row.quantity.times(row.rate)), overridden: null }
}

function materials(
  book: PriceBook,
  { spec, section, piece }: LineWithTakeOff,
  steel: SteelShare,
): ExactCostLine[] {
  const shaftMass = piece.shaftMass.times(spec.quantity)
  const shaft: ExactCostLine = {
    key: 'shaftSteel',
    label: () => `Shaft, ${section.designation} ${spec.grade}`,
    quantity: shaftMass,
    unit: 'kg',
    rate: shaftMass.isZero() ? ZERO : steel.cost.div(shaftMass),
    rateUnit: 'per kg, net of what is left',
    cost: steel.cost,
    basis: steel.basis,
    overridden: null,
  }
  const waste = exact(book.plate.waste)
  const plate = costed({
    key: 'plateSteel',
    label: () => `Plate, ${book.plate.grades.join(' or ')}`,
    quantity: piece.plateMass.times(spec.quantity).times(waste.plus(1)),
    unit: 'kg',
    rate: exact(book.plate.pricePerKg),
    rateUnit: 'per kg',
    basis: () => `${spec.quantity} × ${short(piece.plateMass)} kg and ${short(waste.times(100))} % waste`,
  })
  return [shaft, plate, ...rods(book, spec)]
}

function rods(book: PriceBook, spec: LineWithTakeOff['spec']): ExactCostLine[] {
  const { rods: set } = spec
  const price = set && rodPriceOf(book, set.diameter)
  if (!set || !price) return []
  return [
    costed({
      key: 'rods',
      label: () => `Anchor rods ${size(set.diameter)} mm, ${set.grade}`,
      quantity: exact(set.count).times(spec.quantity),
      unit: 'each',
      rate: exact(price.each),
      rateUnit: 'each',
      basis: () =>
        `${spec.quantity} × ${set.count} sets of rod, nuts and washers, ${size(price.diameter)} mm in the book`,
    }),
  ]
}

function labour(book: PriceBook, { spec, piece }: LineWithTakeOff, steel: SteelShare): ExactCostLine[] {
  const { minutes } = book
  const n = spec.quantity
  const perCut = linear(minutes.sawing, piece.sawnArea.div(1000))
  const cuts = steel.trimCuts.plus(n)
  const perPlate = (one: (plate: (typeof piece.plates)[number]) => Exact) =>
    sum(piece.plates.map(one)).times(n)
  const { perPiece, perPlate: eachPlate, per100kg } = minutes.fitting
  const fitting = exact(perPiece)
    .plus(exact(eachPlate).times(piece.plates.length))
    .plus(exact(per100kg).times(piece.pieceMass).div(100))
  const work: [OverridableItem, string, Exact, () => string][] = [
    [
      'minutes.sawing',
      'Sawing',
      cuts.times(perCut),
      () => `${n} cuts and ${short(steel.trimCuts)} trim cuts of ${short(perCut)} min`,
    ],
    [
      'minutes.plateCutting',
      'Plate cutting',
      perPlate(({ edge, thickness }) => edge.times(linear(minutes.plateCutting, thickness))),
      () => `${n} × ${short(sum(piece.plates.map(({ edge }) => edge)))} m of edge by thickness`,
    ],
    [
      'minutes.drilling',
      'Drilling',
      perPlate(({ holes, thickness }) => linear(minutes.drilling, thickness).times(holes)),
      () => `${n} × ${piece.plates.reduce((all, { holes }) => all + holes, 0)} holes by thickness`,
    ],
    [
      'minutes.welding',
      'Welding',
      sum(
        piece.welds.map(({ leg, length }) => length.times(linear(minutes.welding, exact(leg).pow(2)))),
      ).times(n),
      () => `${n} × ${short(sum(piece.welds.map(({ length }) => length)))} m of fillet by leg`,
    ],
    [
      'minutes.fitting',
      'Fitting and handling',
      fitting.times(n),
      () => `${n} pieces of ${piece.plates.length} plates and ${short(piece.pieceMass)} kg`,
    ],
  ]
  return work.map(([item, label, computed, basis]) => {
    const override = spec.overrides.find((one) => one.item === item)
    return minutesLine(book, item.slice('minutes.'.length), label, computed, basis, override)
  })
}

function minutesLine(
  book: PriceBook,
  key: string,
  label: string,
  computed: Exact,
  basis: () => string,
  override: { value: string; reason: string } | undefined,
): ExactCostLine {
  const minutes = override ? exact(override.value) : settled(computed)
  const rate = exact(book.shopRatePerHour)
  return {
    key,
    label: () => label,
    quantity: minutes,
    unit: 'min',
    rate,
    rateUnit: 'per hour',
    cost: settled(minutes.times(rate).div(60)),
    basis: override ? () => `set by hand: ${override.reason}` : basis,
    overridden: override ? { computed, reason: override.reason } : null,
  }
}

const FINISH_LABELS = { prime: 'Blast and prime', paint: 'Blast and paint', galvanise: 'Galvanise' } as const

function finish(book: PriceBook, { spec, piece }: LineWithTakeOff): ExactCostLine[] {
  if (spec.finish === 'none') return []
  const { per, rate } = book.finish.rates[spec.finish]
  const label = FINISH_LABELS[spec.finish]
  const each = per === 'kg' ? piece.pieceMass : piece.paintedArea
  return [
    costed({
      key: 'finish',
      label: () => label,
      quantity: each.times(spec.quantity),
      unit: per,
      rate: exact(rate),
      rateUnit: `per ${per}`,
      basis: () => `${spec.quantity} × ${short(each)} ${per}`,
    }),
  ]
}

function drawing(book: PriceBook): ExactCostLine {
  return costed({
    key: 'drawing',
    label: () => 'Drawing and checking',
    quantity: exact(1),
    unit: 'mark',
    rate: exact(book.drawingPerMark),
    rateUnit: 'per mark',
    basis: () => 'one mark, however many pieces',
  })
}

function extras({ spec }: LineWithTakeOff): ExactCostLine[] {
  return spec.extras.map(({ description, quantity, unitCost }, index) =>
    costed({
      key: `extra.${index + 1}`,
      label: () => description,
      quantity: exact(quantity),
      unit: 'each',
      rate: exact(unitCost),
      rateUnit: 'each',
      basis: () => 'added by the estimator, for the whole line',
    }),
  )
}

function linear({ a, b }: LinearMinutes, x: Exact | number): Exact {
  return exact(b).times(x).plus(a)
}

/** For reading: at most three places. */
function short(value: Exact): string {
  return value.toDecimalPlaces(3).toFixed()
}
