import type { MoneyDto } from '../../shared/contracts/common.ts'
import { quoteDto, type QuoteDto, type QuoteLineDto } from '../../shared/contracts/quotes.ts'
import { lineRequirement } from '../../shared/contracts/requirement.ts'
import type { ShopDetails } from '../../server/pdf/quote-document.ts'
import { bearing, BRACE, columnCheck, HEIGHT } from './check-fixture.ts'

/*
 * A quote as the shop sees it, cost and all, so that a test can hold that a document leaves those out.
 */

export const shopDetails: ShopDetails = {
  name: 'Harrow Lane Columns',
  address: ['14 Harrow Lane', 'Millbrook 40118'],
  phone: '555 0142',
  email: 'desk@harrowlane.example',
  paper: 'A4',
  system: 'SI',
}

function usd(amount: number): MoneyDto {
  return { amount, currency: 'USD' }
}

const [depth, width, flange, web] = [253, 254, 14.2, 8.64]
const half: [number, number][] = [
  [-width / 2, depth / 2],
  [width / 2, depth / 2],
  [width / 2, depth / 2 - flange],
  [web / 2, depth / 2 - flange],
  [web / 2, -depth / 2 + flange],
  [width / 2, -depth / 2 + flange],
  [width / 2, -depth / 2],
  [-width / 2, -depth / 2],
  [-width / 2, -depth / 2 + flange],
  [-web / 2, -depth / 2 + flange],
  [-web / 2, depth / 2 - flange],
  [-width / 2, depth / 2 - flange],
]

const basePlate = { length: 400, width: 380, thickness: 32 }
const holes = { count: 4, diameter: 27 }
const rods = { count: 4, diameter: 19.05, grade: 'F1554-36' }

function quoteLine(mark: string, quantity: number): QuoteLineDto {
  const requirement = lineRequirement.parse({
    mark,
    quantity,
    method: 'LRFD',
    height: HEIGHT,
    ends: { strong: { bottom: 'fixed', top: 'pinned' }, weak: { bottom: 'pinned', top: 'pinned' } },
    braces: [{ height: BRACE, holds: 'weak', stopsTwist: false }],
    loads: { dead: 420_000, live: 466_000, wind: { pushes: 90_000, lifts: 40_000 } },
    combinations: 'ASCE 7-22',
  })
  return {
    mark,
    requirement,
    spec: {
      mark,
      quantity,
      section: 'W10X49',
      grade: 'A992',
      height: HEIGHT,
      finish: 'prime',
      base: { ...basePlate, holes },
      cap: { length: 280, width: 280, thickness: 16, holes: { count: 0, diameter: 0 } },
      rods,
      welds: [{ where: 'base', leg: 8, length: 1210 }],
      extras: [],
      overrides: [],
    },
    check: columnCheck,
    base: {
      verdict: 'holds',
      plate: { ...basePlate, yield: 248.2 },
      rods: {
        ...rods,
        positions: [
          [-155, -145],
          [-155, 145],
          [155, -145],
          [155, 145],
        ],
      },
      holes,
      welds: { leg: 8, length: 1210 },
      values: {},
      checks: [bearing],
      notes: ['At least four rods stand at every column (OSHA 1926.755).'],
    },
    designationSI: 'W250X73',
    outline: [half],
    depth,
    width,
    alternatives: [],
  }
}

/** A quote of so many marks, A1, A2 and so on, priced alike. */
export function quoteFixture(marks = 2): QuoteDto {
  const lines = Array.from({ length: marks }, (_, index) => quoteLine(`A${index + 1}`, 4))
  const amount = 4 * 159_184 * marks
  const tax = Math.round((amount + 38_000) * 0.0825)
  return quoteDto.parse({
    id: '3d1f3e3c-5d0c-4c39-9a4b-0a3f3bd1a001',
    number: 'Q-1001',
    request: {
      id: '3d1f3e3c-5d0c-4c39-9a4b-0a3f3bd1a002',
      number: 'R-1001',
      title: 'Frame of the north hall',
    },
    company: { id: '3d1f3e3c-5d0c-4c39-9a4b-0a3f3bd1a003', name: 'Åsgård & Łuków Builders' },
    contact: { name: 'Ines Vale', email: 'ines@builders.example' },
    shipTo: { address: '2 Quarry Road, Ashford', region: 'Ashford', km: 100 },
    revisions: [
      { letter: 'A', status: 'superseded', total: usd(1), sentAt: '2026-11-20T09:00:00Z' },
      { letter: 'B', status: 'approved', total: usd(amount + 38_000 + tax), sentAt: null },
    ],
    current: {
      letter: 'B',
      status: 'approved',
      version: 3,
      lines,
      price: {
        lines: lines.map(({ mark }) => ({
          mark,
          quantity: 4,
          section: 'W10X49',
          pieceMass: 506.2,
          unitPrice: usd(159_184),
          linePrice: usd(4 * 159_184),
          cost: {
            lines: [],
            lineCost: '4711.11',
            contingency: '0.03',
            margin: '0.2345',
            marginOverridden: null,
            computedUnitPrice: usd(159_184),
            unitPriceOverridden: null,
            resultingMargin: '0.2345',
            belowFloor: false,
          },
        })),
        delivery: { km: 100, trucks: 1, price: usd(38_000), cost: '311.11' },
        subtotal: usd(amount + 38_000),
        tax: { rate: '0.0825', exempt: false, amount: usd(tax) },
        total: usd(amount + 38_000 + tax),
        deposit: usd(420_000),
        mass: 506.2 * 4 * marks,
        priceBookVersion: 7,
        resultingMargin: '0.2345',
        warnings: ['the margin is thin'],
      },
      discount: '0.05',
      note: 'Rods are delivered with their templates two weeks before the columns.',
      approvedBy: 'Mara Quill',
      approvedAt: '2026-12-01T08:00:00Z',
      sentAt: null,
      validUntil: '2026-12-31T00:00:00Z',
      answeredBy: null,
      answeredAt: null,
      answerReason: null,
      blockers: ['none of the customer’s business'],
    },
    order: null,
    basis: ['Sized by AISC 360-22, LRFD, for the loads, ends and braces as given on each sheet.'],
    exclusions: ['Erection, grout and concrete', 'Permits and special inspection'],
    cautions: [
      'The engineer of record confirms each shape before it is used; local code and the authority having jurisdiction govern.',
      'Columns are not to be erected, loaded or released from the crane before anchorage and bracing are as designed.',
    ],
  })
}
