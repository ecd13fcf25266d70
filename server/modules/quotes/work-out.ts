import type { BodyOf } from '../../../shared/contracts/operations.ts'
import type { LineSpecDto } from '../../../shared/contracts/pricing.ts'
import type { QuoteLineDto } from '../../../shared/contracts/quotes.ts'
import { shipTo } from '../../../shared/contracts/requests.ts'
import type { PriceBook } from '../../../shared/pricing/price-book.ts'
import type { Deps } from '../../deps.ts'
import type { WorkedLine, WorkedQuote } from '../../engine/engine-tasks.ts'
import { fail } from '../../errors.ts'
import { taxRateOf } from '../../shop.ts'
import type { QuoteRow, RevisionRow } from './quotes.repo.ts'

/** What of a revision is worked out, as columns of its row. */
export type WorkColumns = Pick<
  RevisionRow,
  'lines' | 'price' | 'blockers' | 'discount' | 'note' | 'total' | 'currency' | 'priceBookVersion'
>

export interface Work {
  lines: {
    requirement: QuoteLineDto['requirement']
    spec: LineSpecDto
    alternatives: QuoteLineDto['alternatives']
  }[]
  discount: string
  note: string
}

type Job = Pick<QuoteRow, 'shipTo' | 'taxCertificate'>

/** Checks and prices a revision as it shall be. Nothing is written. */
export async function workOut(deps: Deps, job: Job, book: PriceBook, work: Work): Promise<WorkColumns> {
  const { region, km } = shipTo.parse(JSON.parse(job.shipTo))
  const exempt = job.taxCertificate !== null
  const rate = taxRateOf(deps.shop, region)
  const worked = await deps.engine.run('workOut', {
    lines: work.lines.map(({ requirement, spec }) => ({ requirement, spec })),
    book,
    delivery: km > 0 ? { km } : null,
    tax: { rate: rate ?? '0', exempt },
    discount: work.discount,
  })
  const noRate = rate === undefined && !exempt ? [`no tax rate is on file for ${region}`] : []
  return toColumns(worked, work, noRate)
}

function toColumns({ lines, price, blockers }: WorkedQuote, work: Work, noRate: string[]): WorkColumns {
  const kept = lines.map((line, index) => toLine(line, work.lines[index]?.alternatives))
  return {
    lines: JSON.stringify(kept),
    price: JSON.stringify(price),
    blockers: JSON.stringify([...blockers, ...noRate]),
    discount: work.discount,
    note: work.note,
    total: price.total.amount,
    currency: price.total.currency,
    priceBookVersion: price.priceBookVersion,
  }
}

function toLine(line: WorkedLine, alternatives: QuoteLineDto['alternatives']): QuoteLineDto {
  const { mark } = line.spec
  return { mark, ...line, ...(alternatives ? { alternatives } : {}) }
}

/** The estimator's edit on the lines that there are: as many, in the same order; what was asked stays. */
export function editedWork(before: readonly QuoteLineDto[], body: BodyOf<'editRevision'>): Work {
  if (body.lines.length !== before.length) {
    fail('invalid-input', 'Some fields are not right.', {
      issues: [{ path: 'lines', message: `${before.length} lines, as the request has them` }],
    })
  }
  const lines = before.flatMap(({ requirement, alternatives }, index) => {
    const spec = body.lines[index]
    return spec ? [{ requirement, alternatives, spec }] : []
  })
  return { lines, discount: body.discount, note: body.note }
}
