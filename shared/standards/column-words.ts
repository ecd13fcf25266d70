import type { Steel } from '../materials/steel.ts'
import type { Section } from '../sections/section.ts'
import type { ColumnLengths } from '../stability/column-lengths.ts'
import { axisNote } from '../stability/governed-note.ts'
import {
  ADVISED_COMPRESSION_SLENDERNESS,
  ADVISED_TENSION_SLENDERNESS,
  slenderness,
} from './aisc360/slenderness.ts'
import type { PreparedColumn } from './prepare-column.ts'

/** What was taken where the customer did not say, and what every check here rests on. */
export function assumptionsOf(prepared: PreparedColumn, steel: Steel): string[] {
  const { request, terms } = prepared
  const said: string[] = []
  if (terms.standard === 'EN 1993-1-1') {
    said.push('Checked by EN 1993-1-1 with γM0 = γM1 = 1.0; a national annex may choose otherwise.')
    if (request.loads && request.combinations === undefined) {
      said.push(`Loads are combined by ${terms.combinations}, every variable action leading in turn.`)
    }
    if (request.loads?.live && request.liveCategory === undefined) {
      said.push('Imposed load is of category B, offices: ψ0 = 0.7.')
    }
  } else {
    const { standard, method, combinations, liveFactor } = terms
    if (request.standard === undefined || request.method === undefined) {
      said.push(`Checked by ${standard}, ${method}.`)
    }
    if (request.loads && request.combinations === undefined) {
      said.push(`Loads are combined by ${combinations}, every sign of wind and earthquake.`)
    }
    // Allowable stress design has no f1.
    if (method === 'LRFD' && request.loads?.live && request.liveFactor === undefined) {
      said.push(
        `Live load beside other loads counts at f1 = ${liveFactor}; say so for garages, assembly or more than 100 psf.`,
      )
    }
  }
  if (request.grade === undefined) said.push(`Steel is ${steel.title}.`)
  if (request.required) said.push('The required strength is taken as already combined, own weight included.')
  else if (prepared.weighedHeight > 0) said.push('The weight of the column itself is added to the dead load.')
  else if (request.selfWeight !== false)
    said.push(
      'The weight of the column itself is left out, as no height is given: count it in the dead load.',
    )
  if (request.lengths) said.push('Effective lengths are taken as given; no length was worked out.')
  else if ((request.endFixity ?? 'recommended') === 'recommended')
    said.push('Effective length factors are the recommended ones: no fixed end is ideally rigid.')
  else said.push('Effective length factors are the theoretical ones: fixed ends are taken as ideally rigid.')
  if ((request.braces ?? []).length > 0) {
    said.push(
      'Braces are taken as rigid and as holding translation only; each must have the strength and stiffness of AISC 360 Appendix 6.',
    )
  }
  if (prepared.bending === undefined)
    said.push('The load acts along the axis of the column, in simple framing.')
  else said.push('Moments are first-order ones at the head; Appendix 8 amplifies them, and Cb is 1.')
  return said
}

/** What a careful reader should not miss. None of these is a failure by itself. */
export function warningsOf(
  prepared: PreparedColumn,
  section: Section,
  lengths: ColumnLengths,
  uplift: number,
): string[] {
  const warnings: string[] = []
  const strong = slenderness(lengths.strong.used, section.rx)
  const weak = slenderness(lengths.weak.used, section.ry)
  const most = Math.max(strong, weak)
  if (most > ADVISED_COMPRESSION_SLENDERNESS) {
    warnings.push(
      `Lc/r is ${most.toFixed(0)}, more than the ${ADVISED_COMPRESSION_SLENDERNESS} that AISC 360 E2 advises: it is slender to handle and to erect.`,
    )
  }
  if (uplift > 0 && most > ADVISED_TENSION_SLENDERNESS) {
    warnings.push(`In uplift Lc/r is more than the ${ADVISED_TENSION_SLENDERNESS} that AISC 360 D1 advises.`)
  }
  if (prepared.bending && fixedAtFoot(prepared)) {
    warnings.push(
      'A fixed foot under a load off the axis takes a moment: base plate and rods are not designed for it here.',
    )
  }
  for (const axis of ['strong', 'weak'] as const) {
    const free = lengths[axis].segments.some(({ k }) => k === null)
    if (free && lengths[axis].governedBy === 'eigenvalue' && !prepared.request.lengths) {
      warnings.push(
        `${axisNote(axis, lengths[axis])} A top that is free to sway makes the column much weaker than its braced part suggests: hold the top if you can.`,
      )
    }
  }
  return warnings
}

function fixedAtFoot({ request: { ends } }: PreparedColumn): boolean {
  return ends?.strong.bottom === 'fixed' || ends?.weak.bottom === 'fixed'
}

/** What no result here answers for. */
export function notCoveredOf(): string[] {
  return [
    'Moments from sway of the frame, loads across the column, and shear.',
    'The strength and stiffness of the braces, of the ends, and of what they are fixed to.',
    'Concrete breakout, pull-out and shear at the anchor rods; the footing or pier.',
    'Connections other than base and cap plate, holes in the shaft, fire, fatigue, corrosion.',
    'Seismic detailing and overstrength, impact, and loads during erection beyond those stated.',
  ]
}
