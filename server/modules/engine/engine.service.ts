import type { AnswerOf, BodyOf, QueryOf } from '../../../shared/contracts/operations.ts'
import type { ProposalAnswerDto, ScheduleRowDto } from '../../../shared/contracts/proposals.ts'
import type { Deps } from '../../deps.ts'
import type { ProposalBody } from '../../engine/engine-tasks.ts'
import { fail, notFound } from '../../errors.ts'
import { isShop, personOf, type Principal } from '../../http/principal.ts'
import { taxRateOf } from '../../shop.ts'
import { companyOf } from '../companies/companies.service.ts'
import { currentBook } from '../price-books/price-books.service.ts'
import { priceForCustomer } from '../price-books/customer-price.service.ts'
import { toSectionDetail, toSectionSummary } from './sections.map.ts'

export async function listSections(
  { catalogue, db, clock }: Deps,
  { family, q, limit }: QueryOf<'listSections'>,
): Promise<AnswerOf<'listSections'>> {
  const book = await currentBook(db, clock())
  const found = catalogue.search(q ?? '', family ? [family] : undefined)
  return { items: found.slice(0, limit).map((section) => toSectionSummary(section, book)) }
}

export async function readSection(
  { catalogue, db, clock }: Deps,
  designation: string,
): Promise<AnswerOf<'readSection'>> {
  const section = catalogue.find(designation) ?? notFound('section')
  return toSectionDetail(section, await currentBook(db, clock()))
}

/** Strengths that are no steel's are for the estimator to answer for. */
function checkGrade(principal: Principal, { grade }: Pick<BodyOf<'checkColumn'>, 'grade'>): void {
  if (isShop(principal) || grade === undefined || typeof grade === 'string') return
  fail('invalid-input', 'Some fields are not right.', {
    issues: [{ path: 'grade', message: 'the name of a steel; other strengths are the estimator’s to give' }],
  })
}

export async function checkColumn(
  { engine }: Deps,
  principal: Principal,
  body: BodyOf<'checkColumn'>,
): Promise<AnswerOf<'checkColumn'>> {
  checkGrade(principal, body)
  return engine.run('check', body)
}

export async function designBasePlate(
  { engine, db, clock }: Deps,
  body: BodyOf<'designBasePlate'>,
): Promise<AnswerOf<'designBasePlate'>> {
  return engine.run('basePlate', { body, book: await currentBook(db, clock()) })
}

/** The shape that the engine offers, at the price that the caller may see. Nothing is kept. */
export async function propose(
  { engine, db, clock, shop }: Deps,
  principal: Principal,
  body: ProposalBody,
): Promise<ProposalAnswerDto> {
  checkGrade(principal, body)
  const { companyId } = personOf(principal)
  const exempt = companyId !== null && (await companyOf(db, companyId)).taxCertificate !== null
  const rate = taxRateOf(shop, body.delivery?.region ?? '') ?? '0'
  const answer = await engine.run('propose', {
    ...{ body, tax: { rate, exempt } },
    book: await currentBook(db, clock()),
  })
  if (!answer.found || isShop(principal)) return answer
  return { ...answer, price: priceForCustomer(answer.price) }
}

/** Lines of a schedule that are worked out before the next progress is told. */
const CHUNK = 50

/** A schedule, part by part, so that the first answers come while the last are worked out. */
export async function* proposeSchedule(
  { engine, db, clock }: Deps,
  principal: Principal,
  lines: ProposalBody[],
): AsyncGenerator<ScheduleRowDto> {
  for (const line of lines) checkGrade(principal, line)
  const book = await currentBook(db, clock())
  for (let from = 0; from < lines.length; from += CHUNK) {
    const rows = await engine.run('schedule', { lines: lines.slice(from, from + CHUNK), book })
    for (const [at, row] of rows.entries()) yield { index: from + at, of: lines.length, ...row }
  }
}

export function readCapacity(
  { engine }: Deps,
  designation: string,
  query: QueryOf<'readCapacity'>,
): Promise<AnswerOf<'readCapacity'>> {
  return engine.run('capacity', { designation, query })
}
