import type { LineRequirement } from '../../shared/contracts/requirement.ts'
import { braceHolds } from '../../shared/drawing/describe-column.ts'
import { detailLabel, forceLabel, heightLabel } from '../../shared/drawing/labels.ts'
import { formatQuantity } from '../../shared/units/render.ts'
import type { UnitSystem } from '../../shared/units/step.ts'
import { percentText } from './quantities.ts'

export type Fact = [label: string, text: string]

/** What was asked of a column, each as a label and its words. */
export function requirementFacts(asked: LineRequirement, system: UnitSystem): Fact[] {
  const facts: Fact[] = [['Standard', [asked.standard, asked.method].filter(Boolean).join(', ')]]
  if (asked.height !== undefined) facts.push(['Height', heightLabel(asked.height, system)])
  if (asked.ends) facts.push(['Ends', endsText(asked.ends)])
  facts.push(['Braces', bracesText(asked.braces, system)])
  if (asked.loads) facts.push(['Loads', loadsText(asked.loads, system)])
  if (asked.required) facts.push(['Required', requiredText(asked.required, system)])
  if (asked.combinations) facts.push(['Combinations', asked.combinations])
  if (asked.offset) facts.push(['Off centre', offsetText(asked.offset, system)])
  facts.push(['Own weight', asked.selfWeight ? 'added to the dead load' : 'not added'])
  facts.push(['Ends as built', `${asked.endFixity} K`])
  const limits = limitsText(asked.limits, system)
  if (limits) facts.push(['Limits', limits])
  if (asked.base.plate) {
    facts.push(['Concrete', `f′c ${formatQuantity(asked.base.concrete.strength, 'MPa', system)}`])
  }
  return facts
}

function endsText({ strong, weak }: NonNullable<LineRequirement['ends']>): string {
  const one = (ends: typeof strong) => `base ${ends.bottom}, top ${ends.top}`
  return one(strong) === one(weak)
    ? `${one(strong)}, both axes`
    : `strong axis ${one(strong)}; weak axis ${one(weak)}`
}

function bracesText(braces: LineRequirement['braces'], system: UnitSystem): string {
  if (braces.length === 0) return 'none between the ends'
  return braces.map((brace) => `at ${heightLabel(brace.height, system)}, ${braceHolds(brace)}`).join('. ')
}

const CASES = { dead: 'dead', live: 'live', roofLive: 'roof live', snow: 'snow', rain: 'rain' } as const

function loadsText(loads: NonNullable<LineRequirement['loads']>, system: UnitSystem): string {
  const label = (value: number) => forceLabel(value, system)
  const cases = (Object.keys(CASES) as (keyof typeof CASES)[])
    .filter((name) => loads[name] !== 0)
    .map((name) => `${CASES[name]} ${label(loads[name])}`)
  const ways = (['wind', 'earthquake'] as const).flatMap((name) => {
    const { pushes, lifts } = loads[name]
    return [
      ...(pushes ? [`${name} down ${label(pushes)}`] : []),
      ...(lifts ? [`${name} up ${label(lifts)}`] : []),
    ]
  })
  const { vertical } = loads.earthquake
  return [...cases, ...ways, ...(vertical ? [`vertical earthquake ${label(vertical)}`] : [])].join(', ')
}

function requiredText(required: NonNullable<LineRequirement['required']>, system: UnitSystem): string {
  const { axial, momentStrong, momentWeak } = required
  const moment = (value: number) => formatQuantity(value, 'N·mm', system)
  return [
    `${axial < 0 ? 'uplift' : 'compression'} ${forceLabel(Math.abs(axial), system)}`,
    ...(momentStrong ? [`strong-axis moment ${moment(momentStrong)}`] : []),
    ...(momentWeak ? [`weak-axis moment ${moment(momentWeak)}`] : []),
  ].join(', ')
}

function offsetText(offset: NonNullable<LineRequirement['offset']>, system: UnitSystem): string {
  return `${detailLabel(offset.strong, system)} along the depth, ${detailLabel(offset.weak, system)} along the width`
}

function limitsText(limits: LineRequirement['limits'], system: UnitSystem): string {
  return [
    ...(limits.families ? [limits.families.join(', ')] : []),
    ...(limits.maxDepth ? [`depth to ${detailLabel(limits.maxDepth, system)}`] : []),
    ...(limits.maxWidth ? [`width to ${detailLabel(limits.maxWidth, system)}`] : []),
    ...(limits.maxSlenderness ? [`slenderness to ${limits.maxSlenderness}`] : []),
    ...(limits.maxUtilisation < 1 ? [`used to ${percentText(limits.maxUtilisation)}`] : []),
  ].join(', ')
}
