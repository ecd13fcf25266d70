import { MM_PER_INCH } from '../units/convert.ts'
import { formatQuantity } from '../units/render.ts'
import type { UnitSystem } from '../units/step.ts'

/** Workshop fractions stop at a sixteenth of an inch. */
const SIXTEENTHS = 16

/** A height as a fabricator reads it: metres to the millimetre, or feet, inches and sixteenths. */
export function heightLabel(mm: number, system: UnitSystem): string {
  if (system === 'US') return feetAndInches(mm)
  const metres = (mm / 1000).toFixed(3)
  return `${metres.endsWith('0') ? metres.slice(0, -1) : metres} m`
}

/** A computed length, which no tape has to find again: two decimals of metres or feet. */
export function computedLengthLabel(mm: number, system: UnitSystem): string {
  return system === 'US' ? `${(mm / MM_PER_INCH / 12).toFixed(2)} ft` : `${(mm / 1000).toFixed(2)} m`
}

/** A dimension of a plate: tenths of a millimetre, or inches and sixteenths. */
export function detailLabel(mm: number, system: UnitSystem): string {
  return system === 'US' ? `${inchesAndSixteenths(mm)}″` : `${Math.round(mm * 10) / 10} mm`
}

/** A published dimension of a rolled shape, which US tables give in decimal inches. */
export function shapeLabel(mm: number, system: UnitSystem): string {
  if (system === 'SI') return `${Math.round(mm * 10) / 10} mm`
  return `${Number((mm / MM_PER_INCH).toPrecision(3))}″`
}

export function forceLabel(newtons: number, system: UnitSystem): string {
  return formatQuantity(newtons, 'N', system)
}

function feetAndInches(mm: number): string {
  const sixteenths = Math.round((mm / MM_PER_INCH) * SIXTEENTHS)
  const feet = Math.trunc(sixteenths / (12 * SIXTEENTHS))
  const inches = sixteenths - feet * 12 * SIXTEENTHS
  // 5′-0 1/2″, since 5′-1/2″ is read as five and a half feet.
  return `${feet}′-${inches < SIXTEENTHS && inches > 0 ? '0 ' : ''}${wholeAndFraction(inches)}″`
}

function inchesAndSixteenths(mm: number): string {
  return wholeAndFraction(Math.round((mm / MM_PER_INCH) * SIXTEENTHS))
}

function wholeAndFraction(sixteenths: number): string {
  const whole = Math.trunc(sixteenths / SIXTEENTHS)
  let above = sixteenths - whole * SIXTEENTHS
  let below = SIXTEENTHS
  while (above > 0 && above % 2 === 0) {
    above /= 2
    below /= 2
  }
  if (above === 0) return String(whole)
  return whole === 0 ? `${above}/${below}` : `${whole} ${above}/${below}`
}
