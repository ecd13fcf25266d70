import type { AnswerOf, BodyOf, QueryOf } from '../../../shared/contracts/operations.ts'
import type { ProposalAnswerDto } from '../../../shared/contracts/proposals.ts'
import type { Deps } from '../../deps.ts'
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
  body: BodyOf<'propose'>,
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
