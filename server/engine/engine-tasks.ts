import { catalogue } from '../../seeds/reference/catalogue.ts'
import { designBase } from '../../shared/base/design-base.ts'
import type { BodyOf, QueryOf } from '../../shared/contracts/operations.ts'
import type { ProposalAnswerDto } from '../../shared/contracts/proposals.ts'
import type { CapacityDto } from '../../shared/contracts/sections.ts'
import type { RequestDto } from '../../shared/contracts/requests.ts'
import type { LineRequirement } from '../../shared/contracts/requirement.ts'
import { steelFor } from '../../shared/materials/steel-for.ts'
import type { PriceBook } from '../../shared/pricing/price-book.ts'
import { capacityCurve } from '../../shared/proposal/capacity-curve.ts'
import { scheduler, type ScheduleRow } from '../../shared/proposal/propose-schedule.ts'
import { propose } from '../../shared/proposal/propose.ts'
import { EU_FAMILIES } from '../../shared/sections/catalogue.ts'
import type { Section } from '../../shared/sections/section.ts'
import { checkColumn } from '../../shared/standards/check-column.ts'
import { prepareColumn } from '../../shared/standards/prepare-column.ts'
import { refuse } from '../../shared/units/refusal.ts'
import { beginWork, workOut } from './quote-work.ts'

export type { BegunLine, WorkedLine, WorkedQuote } from './quote-work.ts'

function sectionOf(name: string): Section {
  return (
    catalogue.find(name) ?? refuse('section', `${name} is not in the catalogue; a designation such as W10X49`)
  )
}

function check({ section: name, ...request }: BodyOf<'checkColumn'>) {
  const section = sectionOf(name)
  return checkColumn(prepareColumn(request), section, steelFor(request.grade, section))
}

function basePlate({ body, book }: { body: BodyOf<'designBasePlate'>; book: PriceBook }) {
  const { section, ...rest } = body
  const rodDiameters = book.rods.prices.map(({ diameter }) => diameter)
  return designBase({
    ...rest,
    section: sectionOf(section),
    stock: { thicknesses: book.plate.thicknesses, rodDiameters },
  })
}

type ScheduleBody = Extract<BodyOf<'propose'>, unknown[]>
export type ProposalBody = Exclude<BodyOf<'propose'>, unknown[]>

interface ToPropose {
  body: ProposalBody
  book: PriceBook
  tax: { rate: string; exempt: boolean }
}

function proposeOne({ body, book, tax }: ToPropose): ProposalAnswerDto {
  const { delivery, section, ...asked } = body
  const terms = delivery && delivery.km > 0 ? { km: delivery.km } : null
  return propose({ asked, catalogue, book, delivery: terms, tax, section })
}

/** A part of a schedule. */
function schedule({ lines, book }: { lines: ScheduleBody; book: PriceBook }): ScheduleRow[] {
  const offer = scheduler(catalogue, book)
  return lines.map(({ delivery, section: _, ...asked }) =>
    offer({ asked, delivery: delivery && delivery.km > 0 ? { km: delivery.km } : null }),
  )
}

const CURVE_POINTS = 61

function capacity({
  designation,
  query,
}: {
  designation: string
  query: QueryOf<'readCapacity'>
}): CapacityDto {
  const section = sectionOf(designation)
  const { method, to, grade } = query
  const standard = query.standard ?? (EU_FAMILIES.includes(section.family) ? 'EN 1993-1-1' : 'AISC 360-22')
  const steel = steelFor(grade, section)
  const points = capacityCurve(section, steel, { standard, method }, to, CURVE_POINTS)
  return {
    section: section.designation,
    standard,
    method: standard === 'EN 1993-1-1' ? '' : method,
    steel: steel.title,
    points,
  }
}

type Offer = RequestDto['lines'][number]['offered']

/** What a list of lines would be made of; null for a line that cannot be taken, or that nothing fits. */
function offer({ requirements, book }: { requirements: LineRequirement[]; book: PriceBook }): Offer[] {
  const find = scheduler(catalogue, book)
  return requirements.map((asked) => {
    const { offered } = find({ asked, delivery: null })
    if (!offered) return null
    const { section, utilisation, unitPrice } = offered
    return { section, utilisation, unitPrice }
  })
}

/** What the engine does for the server, by name: plain values in, plain values out. */
export const engineTasks = {
  check,
  basePlate,
  propose: proposeOne,
  schedule,
  capacity,
  offer,
  beginWork,
  workOut,
}
export type EngineTasks = typeof engineTasks
export type TaskName = keyof EngineTasks
