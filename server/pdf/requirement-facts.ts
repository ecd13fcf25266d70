import { FAMILY_NAMES } from '../../shared/sections/family-names.ts'
import type { LineRequirement } from '../../shared/contracts/requirement.ts'
import { braceHolds } from '../../shared/drawing/describe-column.ts'
import { detailLabel, forceLabel, heightLabel } from '../../shared/drawing/labels.ts'
import { figures } from '../../shared/units/figures.ts'
import { formatQuantity } from '../../shared/units/render.ts'
import type { UnitSystem } from '../../shared/units/step.ts'
import type { Fact } from './fact-columns.ts'
import { percent } from './figures.ts'

/** What was asked, each as a label and its words; only what was said or assumed. */
export function requirementFacts(asked: LineRequirement, system: UnitSystem): Fact[] {
  const facts: Fact[] = [['Standard', [asked.standard, asked.method].filter(Boolean).join(', ')]]
  if (asked.height !== undefined) facts.push(['Height', heightLabel(asked.height, system)])
  if (asked.ends) facts.push(['Ends', endsText(asked.ends)])
  asked.braces.forEach((brace, index) => {
    facts.push([`Brace ${index + 1}`, braceText(brace, system)])
  })
  if (asked.lengths) facts.push(['Lengths given', lengthsText(asked.lengths, system)])
  if (asked.required) facts.push(['Required', requiredText(asked.required, system)])
  if (asked.loads) facts.push(['Loads', loadsText(asked.loads, system)])
  if (asked.combinations) facts.push(['Combinations', asked.combinations])
  if (asked.offset) facts.push(['Load offset', offsetText(asked.offset, system)])
  facts.push(['Own weight', asked.selfWeight ? 'added to the dead load' : 'not added'])
  facts.push(['End fixity', `${asked.endFixity} K`])
  const limits = limitsText(asked.limits, system)
  if (limits) facts.push(['Limits', limits])
  if (asked.base.plate)
    facts.push(['Concrete', `f'c ${formatQuantity(asked.base.concrete.strength, 'MPa', system)}`])
  return facts
}

function braceText(brace: LineRequirement['braces'][number], system: UnitSystem): string {
  return `at ${heightLabel(brace.height, system)}, holds ${braceHolds(brace)}`
}

function endsText({ strong, weak }: NonNullable<LineRequirement['ends']>): string {
  const one = (ends: typeof strong) => `foot ${ends.bottom}, head ${ends.top}`
  if (one(strong) === one(weak)) return `${one(strong)}, both axes`
  return `strong axis ${one(strong)}; weak axis ${one(weak)}`
}

function lengthsText(lengths: NonNullable<LineRequirement['lengths']>, system: UnitSystem): string {
  const { strong, weak, torsion } = lengths
  const label = (value: number) => heightLabel(value, system)
  return `strong ${label(strong)}, weak ${label(weak)}, torsion ${label(torsion)}`
}

function requiredText(required: NonNullable<LineRequirement['required']>, system: UnitSystem): string {
  const { axial, momentStrong, momentWeak } = required
  const parts = [
    axial < 0 ? `uplift ${forceLabel(-axial, system)}` : `compression ${forceLabel(axial, system)}`,
  ]
  if (momentStrong) parts.push(`moment about the strong axis ${formatQuantity(momentStrong, 'N·mm', system)}`)
  if (momentWeak) parts.push(`moment about the weak axis ${formatQuantity(momentWeak, 'N·mm', system)}`)
  return parts.join(', ')
}

const CASES = { dead: 'dead', live: 'live', roofLive: 'roof live', snow: 'snow', rain: 'rain' } as const

function loadsText(loads: NonNullable<LineRequirement['loads']>, system: UnitSystem): string {
  const label = (value: number) => forceLabel(value, system)
  const parts = (Object.keys(CASES) as (keyof typeof CASES)[])
    .filter((name) => loads[name] !== 0)
    .map((name) => `${CASES[name]} ${label(loads[name])}`)
  for (const name of ['wind', 'earthquake'] as const) {
    const { pushes, lifts } = loads[name]
    if (pushes) parts.push(`${name} down ${label(pushes)}`)
    if (lifts) parts.push(`${name} up ${label(lifts)}`)
  }
  if (loads.earthquake.vertical) parts.push(`vertical earthquake ${label(loads.earthquake.vertical)}`)
  return parts.join(', ')
}

function offsetText({ strong, weak }: NonNullable<LineRequirement['offset']>, system: UnitSystem): string {
  return `${detailLabel(strong, system)} bending about the strong axis, ${detailLabel(weak, system)} about the weak`
}

function limitsText(limits: LineRequirement['limits'], system: UnitSystem): string {
  const parts: string[] = []
  if (limits.families) parts.push(limits.families.map((family) => FAMILY_NAMES[family]).join(' or '))
  if (limits.maxDepth) parts.push(`depth to ${detailLabel(limits.maxDepth, system)}`)
  if (limits.maxWidth) parts.push(`width to ${detailLabel(limits.maxWidth, system)}`)
  if (limits.maxSlenderness) parts.push(`slenderness to ${figures(limits.maxSlenderness)}`)
  if (limits.maxUtilisation < 1) parts.push(`utilisation to ${percent(limits.maxUtilisation)}`)
  return parts.join(', ')
}
