import { catalogue } from '../../seeds/reference/catalogue.ts'
import { designBase } from '../../shared/base/design-base.ts'
import type { BodyOf } from '../../shared/contracts/operations.ts'
import type { ProposalAnswerDto } from '../../shared/contracts/proposals.ts'
import type { RequestDto } from '../../shared/contracts/requests.ts'
import type { LineRequirement } from '../../shared/contracts/requirement.ts'
import { steelFor } from '../../shared/materials/steel-for.ts'
import type { PriceBook } from '../../shared/pricing/price-book.ts'
import { propose } from '../../shared/proposal/propose.ts'
import type { Section } from '../../shared/sections/section.ts'
import { checkColumn } from '../../shared/standards/check-column.ts'
import { prepareColumn } from '../../shared/standards/prepare-column.ts'
import { Refusal, refuse } from '../../shared/units/refusal.ts'
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

interface ToPropose {
  body: BodyOf<'propose'>
  book: PriceBook
  tax: { rate: string; exempt: boolean }
}

function proposeOne({ body, book, tax }: ToPropose): ProposalAnswerDto {
  const { delivery, section, ...asked } = body
  const terms = delivery && delivery.km > 0 ? { km: delivery.km } : null
  return propose({ asked, catalogue, book, delivery: terms, tax, section })
}

type Offer = RequestDto['lines'][number]['offered']

/** What a list of lines would be made of; null for a line that cannot be taken, or that nothing fits. */
function offer({ requirements, book }: { requirements: LineRequirement[]; book: PriceBook }): Offer[] {
  return requirements.map((asked) => {
    try {
      const found = propose({ asked, catalogue, book, delivery: null })
      if (!found.found) return null
      const unitPrice = found.price.lines[0]?.unitPrice
      if (!unitPrice) return null
      return { section: found.section, utilisation: found.check.utilisation, unitPrice }
    } catch (error) {
      if (error instanceof Refusal) return null
      throw error
    }
  })
}

/** What the engine does for the server, by name: plain values in, plain values out. */
export const engineTasks = { check, basePlate, propose: proposeOne, offer, beginWork, workOut }
export type EngineTasks = typeof engineTasks
export type TaskName = keyof EngineTasks
