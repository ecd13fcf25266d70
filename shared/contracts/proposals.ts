import { z } from 'zod'
import { money } from './common.ts'
import { columnCheck, basePlateAnswer } from './checks.ts'
import { pricedQuote, shownLineSpec } from './pricing.ts'
import { lineRequirement } from './requirement.ts'
import { outline } from './sections.ts'

export const alternative = z.object({
  section: z.string(),
  designationSI: z.string(),
  family: z.string(),
  /** Why it is shown: `cheapest`, `lightest`, `slimmest` or nothing. */
  because: z.array(z.enum(['cheapest', 'lightest', 'slimmest', 'soonest'])),
  utilisation: z.number(),
  mass: z.number(),
  depth: z.number(),
  width: z.number(),
  unitPrice: money,
})
export const proposal = z.object({
  found: z.literal(true),
  section: z.string(),
  designationSI: z.string(),
  outline,
  depth: z.number(),
  width: z.number(),
  check: columnCheck,
  base: basePlateAnswer.nullable(),
  /** How it would be made: the start of the estimator's work. */
  spec: shownLineSpec,
  alternatives: z.array(alternative),
  /** Why the next lighter shape does not do. */
  nextLighter: z.object({ section: z.string(), reason: z.string() }).nullable(),
  /** What would make it cheaper, the largest saving first: changes that the customer could make. */
  advice: z
    .array(z.object({ change: z.string(), section: z.string(), saves: money, unitPrice: money }))
    .default([]),
  /** Of this line alone; tax and delivery as for a quote of one line. */
  price: pricedQuote,
})
export const noProposal = z.object({
  found: z.literal(false),
  reason: z.string(),
  nearest: z.object({ section: z.string(), utilisation: z.number(), needs: z.string() }).nullable(),
})
export const proposalBody = lineRequirement.extend({
  /** Left out: collected. With a tax region that the shop knows, tax is in the price. */
  delivery: z
    .strictObject({ km: z.number().min(0).max(5000), region: z.string().trim().max(40).optional() })
    .optional(),
  /** Another shape than the cheapest: the one to propose. */
  section: z.string().trim().min(1).max(60).optional(),
})
/** A schedule: many lines at once, answered as a stream, one JSON object a line. */
export const scheduleBody = z.array(proposalBody).min(1).max(1000)
/** One line of that stream: how far it has come, and what is offered for the mark or why nothing is. */
export const scheduleRow = z.object({
  index: z.int(),
  of: z.int(),
  mark: z.string(),
  offered: z
    .object({ section: z.string(), utilisation: z.number(), unitPrice: money, linePrice: money })
    .nullable(),
  reason: z.string().nullable(),
})
export type ScheduleRowDto = z.infer<typeof scheduleRow>
export const proposalAnswer = z.discriminatedUnion('found', [proposal, noProposal])
export type ProposalDto = z.infer<typeof proposal>
export type ProposalAnswerDto = z.infer<typeof proposalAnswer>
