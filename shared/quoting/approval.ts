import { compare, moneyToDecimal, type Money } from '../pricing/money.ts'
import { size } from '../pricing/take-off.ts'

export interface Approval {
  total: Money
  /** Up to this an estimator approves what they prepared; null: no limit is set. */
  limit: Money | null
  /** Who last changed the revision, and who approves it. */
  preparedBy: string
  approver: string
}

/** Why this person cannot approve; null when they can. Above the limit it takes a second person. */
export function approvalFault({ total, limit, preparedBy, approver }: Approval): string | null {
  if (limit === null || compare(total, limit) <= 0 || preparedBy !== approver) return null
  const amount = `${limit.currency} ${moneyToDecimal(limit)}`
  return `the total is above ${amount}: somebody other than who prepared it must approve`
}

export interface RevisionWork {
  lines: readonly { mark: string; utilisation: number; holds: boolean; baseHolds: boolean | null }[]
  /** Pieces that no bar takes, as the price tells. */
  steel: readonly { section: string; nest: { unplaced: readonly { length: number }[] } }[]
}

/** What stands in the way of approving, whoever approves: each in words; empty when nothing does. */
export function approvalBlockers({ lines, steel }: RevisionWork): string[] {
  const failing = lines.flatMap(({ mark, utilisation, holds, baseHolds }) => {
    const faults: string[] = []
    const works = Number.isFinite(utilisation)
      ? `it works at ${Math.ceil(utilisation * 100)} %`
      : 'it is unstable'
    if (!holds) faults.push(`${mark} does not hold: ${works}`)
    if (baseHolds === false) faults.push(`${mark}: its base plate does not hold`)
    return faults
  })
  const spliced = steel.flatMap(({ section, nest }) =>
    nest.unplaced.map(
      ({ length }) => `${section}: ${size(length)} mm is longer than every bar and needs a splice`,
    ),
  )
  return [...failing, ...spliced]
}
