import type { PriceBook } from '../../shared/pricing/price-book.ts'
import { MM_PER_INCH } from '../../shared/units/convert.ts'

const EIGHTHS = [3, 4, 5, 6, 7, 8, 10, 12, 14, 16, 18, 20]
/** To a ten-thousandth of a millimetre, which every inch size here is exact to. */
const inMillimetres = (inches: number) => Math.round(inches * MM_PER_INCH * 1e4) / 1e4
const inchPlates = EIGHTHS.map((eighths) => inMillimetres(eighths / 8))
const metricPlates = [10, 12, 16, 20, 25, 30, 35, 40, 50, 60]

/** The price book that a new shop starts from; invented figures in US dollars. */
export const DEFAULT_PRICE_BOOK: PriceBook = {
  version: 1,
  firstDay: '2026-01-01',
  currency: 'USD',
  bars: [
    {
      title: 'W shapes',
      families: ['W'],
      grades: ['A992'],
      pricePerKg: '1.85',
      stockLengths: [6096, 9144, 12192, 15240, 18288],
    },
    {
      title: 'HSS, square and rectangular',
      families: ['HSS_SQUARE', 'HSS_RECT'],
      grades: ['A500-C'],
      pricePerKg: '2.25',
      stockLengths: [6096, 7315, 12192, 14630],
    },
    {
      title: 'HSS, round',
      families: ['HSS_ROUND'],
      grades: ['A500-C'],
      pricePerKg: '2.45',
      stockLengths: [6401, 12802],
    },
    {
      title: 'Pipe',
      families: ['PIPE'],
      grades: ['A53-B'],
      pricePerKg: '2.60',
      stockLengths: [6401, 12802],
    },
    {
      title: 'HE and UC shapes',
      families: ['HEA', 'HEB', 'HEM', 'UC'],
      grades: ['S355'],
      pricePerKg: '1.95',
      stockLengths: [6100, 12100, 15100],
    },
    {
      title: 'Hot-finished hollow sections',
      families: ['SHS', 'RHS', 'CHS'],
      grades: ['S355'],
      pricePerKg: '2.35',
      stockLengths: [6100, 12100, 15100],
    },
  ],
  plate: {
    grades: ['A36', 'S275'],
    pricePerKg: '2.10',
    waste: '0.12',
    thicknesses: [...inchPlates, ...metricPlates].sort((a, b) => a - b),
  },
  rods: {
    grades: ['F1554-36'],
    prices: [
      { diameter: inMillimetres(0.75), each: '11.50' },
      { diameter: inMillimetres(1), each: '19.00' },
      { diameter: inMillimetres(1.25), each: '31.00' },
      { diameter: inMillimetres(1.5), each: '46.00' },
    ],
  },
  cutting: { kerf: 3, endTrim: 10, reusableLength: 900, remnantWorth: '0.60', scrapPerKg: '0.28' },
  shopRatePerHour: '78.00',
  minutes: {
    sawing: { a: '6', b: '0.90' },
    plateCutting: { a: '1.2', b: '0.08' },
    drilling: { a: '1.4', b: '0.05' },
    welding: { a: '4.0', b: '0.55' },
    fitting: { perPiece: '14', perPlate: '6', per100kg: '1.5' },
  },
  finish: {
    rates: {
      prime: { per: 'm²', rate: '14.50' },
      paint: { per: 'm²', rate: '31.00' },
      galvanise: { per: 'kg', rate: '1.15' },
    },
    minimumPerOrder: '180.00',
  },
  drawingPerMark: '95.00',
  delivery: { base: '140.00', perKm: '2.40', payload: 20_000, longestPiece: 13_500 },
  contingency: '0.02',
  margin: '0.18',
  floorMargin: '0.10',
  deposit: { fraction: '0.30', floor: '250.00' },
  holdsDays: 21,
}
