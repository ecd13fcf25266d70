/** A statement of the trade, the same words on the screen, on paper and in mail. */
export interface Statement {
  key: string
  text: string
}

/**
 * Cautions that stand wherever a shape is proposed, accepted or drawn. Release from the crane and anchorage:
 * 29 CFR 1926.755 and 1926.756; seals and the authority having jurisdiction are matters of local law.
 */
export const CAUTIONS: readonly Statement[] = [
  {
    key: 'as-given',
    text: 'Each column is sized for the loads, ends and braces as given, and for nothing else.',
  },
  {
    key: 'engineer-of-record',
    text: 'Shape and capacity are a proposal: the engineer of record confirms them before they are used.',
  },
  {
    key: 'local-code',
    text: 'Local code and the authority having jurisdiction govern.',
  },
  {
    key: 'braces',
    text: 'A column is only as good as its braces: each must have at least the strength and stiffness stated with it.',
  },
  {
    key: 'erection',
    text: 'Columns are not to be erected, loaded or released from the crane before anchorage and bracing are as designed.',
  },
  {
    key: 'concrete',
    text: 'Concrete breakout, pull-out and shear at the anchor rods are not covered here and must be designed by others.',
  },
  {
    key: 'seal',
    text: 'Where law asks for it, a licensed engineer seals the design.',
  },
]

/** What the price does not include. */
export const EXCLUSIONS: readonly Statement[] = [
  { key: 'erection', text: 'Erection, unloading, temporary bracing and shims' },
  { key: 'foundations', text: 'Concrete, grout, and setting of anchor rods' },
  { key: 'connections', text: 'Beams, braces and their connections, unless listed as an extra' },
  { key: 'site-work', text: 'Field welding, field bolting and touch-up of finish on site' },
  { key: 'fire', text: 'Fire protection' },
  { key: 'permits', text: 'Permits, special inspection and sealed drawings' },
]

export const BRACES_TAKEN_AS =
  'Braces are taken as rigid and as holding translation only; the ends are taken to hold as stated.'

export interface BasisFacts {
  /** Such as `AISC 360-22, LRFD`, each once. */
  standards: readonly string[]
  /** Kilometres to the ship-to address; null when the customer collects. */
  deliveryKm: number | null
  holdsDays: number
  taxExempt: boolean
}

/** What a quote is based on, each in one sentence. */
export function basisStatements({ standards, deliveryKm, holdsDays, taxExempt }: BasisFacts): string[] {
  const delivery =
    deliveryKm === null
      ? 'Collected from the shop by the customer.'
      : `Delivered by truck to the ship-to address, ${Math.round(deliveryKm)} km; unloading is the customer's.`
  return [
    `Sized by ${standards.join(' and ')} for the loads, ends and braces stated with each mark.`,
    BRACES_TAKEN_AS,
    'Heights run from the underside of the base plate to the top of the cap plate.',
    'Section, steel, plates, rods and finish are as listed with each mark.',
    delivery,
    taxExempt
      ? 'No tax is charged: an exemption certificate is on file.'
      : 'Tax is charged on the work and its delivery at the rate of the ship-to address.',
    `The price is for the whole quantity in one order and holds for ${holdsDays} days from the day it is sent; after that it can only be repriced.`,
    'The deposit is due on acceptance; no steel is ordered before it is in, unless credit terms were agreed.',
  ]
}
