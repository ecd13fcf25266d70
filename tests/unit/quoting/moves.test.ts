import { describe, expect, it } from 'vitest'
import { actionsFor, mayMove, moveFault, statusAfter } from '../../../shared/quoting/may-move.ts'
import { ACTIONS, type ActionOf } from '../../../shared/quoting/moves.ts'
import { ACTORS, STATUSES, type Actor, type Kind } from '../../../shared/quoting/statuses.ts'

/*
 * Source: the states of the desk as its product description draws them, written out here a second time, one arrow a
 * line: status, action, status, who. Everything else is tried and must be refused.
 */
const DRAWN: Record<Kind, string> = {
  request: `
    draft > edit > draft: contractor
    draft > submit > submitted: contractor
    draft > withdraw > withdrawn: contractor
    submitted > withdraw > withdrawn: contractor
    submitted > review > in review: estimator, admin
    submitted > decline > declined: estimator, admin
    in review > withdraw > withdrawn: contractor
    in review > decline > declined: estimator, admin
    in review > markQuoted > quoted: system
    quoted > close > closed: estimator, admin, system`,
  revision: `
    draft > edit > draft: estimator, admin
    draft > approve > approved: estimator, admin
    draft > withdraw > withdrawn: estimator, admin
    approved > send > sent: estimator, admin
    approved > withdraw > withdrawn: estimator, admin
    approved > revise > approved: estimator, admin
    approved > supersede > superseded: system
    sent > accept > accepted: contractor, link
    sent > decline > declined: contractor, link
    sent > withdraw > withdrawn: estimator, admin
    sent > revise > sent: estimator, admin
    sent > expire > expired: system
    sent > supersede > superseded: system
    declined > revise > declined: estimator, admin
    expired > revise > expired: estimator, admin
    withdrawn > revise > withdrawn: estimator, admin`,
  order: `
    awaiting deposit > pay > awaiting deposit: contractor, link
    awaiting deposit > release > released: accounts, admin, system
    awaiting deposit > cancel > cancelled: estimator, admin
    released > start > in fabrication: estimator, admin
    released > cancel > cancelled: admin
    in fabrication > makeReady > ready: estimator, admin
    in fabrication > cancel > cancelled: admin
    ready > dispatch > dispatched: estimator, admin
    ready > cancel > cancelled: admin
    dispatched > complete > completed: estimator, admin`,
  payment: `
    pending > settle > succeeded: accounts, system
    pending > fail > failed: accounts, system
    failed > settle > succeeded: system
    succeeded > refundPart > refunded in part: accounts, system
    succeeded > refund > refunded: accounts, system
    succeeded > dispute > disputed: system
    refunded in part > refundPart > refunded in part: accounts, system
    refunded in part > refund > refunded: accounts, system
    refunded in part > dispute > disputed: system
    disputed > winDispute > succeeded: system
    disputed > loseDispute > refunded: system`,
}

const KINDS = Object.keys(DRAWN) as Kind[]

function drawn(kind: Kind): string[] {
  return DRAWN[kind]
    .trim()
    .split('\n')
    .flatMap((line) => {
      const [arrow = '', who = ''] = line.trim().split(': ')
      return who.split(', ').map((actor) => `${actor}: ${arrow}`)
    })
    .sort()
}

interface Tried<K extends Kind> {
  actor: Actor
  from: (typeof STATUSES)[K][number]
  action: ActionOf<K>
}

function everything<K extends Kind>(kind: K): Tried<K>[] {
  const statuses: readonly (typeof STATUSES)[K][number][] = STATUSES[kind]
  const actions: readonly ActionOf<K>[] = ACTIONS[kind]
  return ACTORS.flatMap((actor) =>
    statuses.flatMap((from) => actions.map((action) => ({ actor, from, action }))),
  )
}

describe.each(KINDS)('moves of a %s', (kind) => {
  it('are those drawn, for every role on every move', () => {
    const allowed = everything(kind)
      .filter(({ actor, from, action }) => mayMove(kind, actor, from, action))
      .map(
        ({ actor, from, action }) =>
          `${actor}: ${from} > ${action} > ${statusAfter(kind, actor, from, action)}`,
      )
    expect(allowed.sort()).toEqual(drawn(kind))
  })

  it('are what the buttons show', () => {
    for (const { actor, from, action } of everything(kind)) {
      expect(actionsFor(kind, actor, from).includes(action)).toBe(mayMove(kind, actor, from, action))
    }
  })

  it('say whether it is the person or the moment that is wrong', () => {
    for (const { actor, from, action } of everything(kind)) {
      const ever = drawn(kind).some((line) => line.startsWith(`${actor}: `) && line.includes(`> ${action} >`))
      const now = mayMove(kind, actor, from, action)
      expect(moveFault(kind, actor, from, action)).toBe(now ? undefined : ever ? 'status' : 'role')
    }
  })

  it('reach every status from the first', () => {
    const statuses: readonly string[] = STATUSES[kind]
    const reached = new Set<string>([statuses[0] ?? ''])
    for (let before = 0; before !== reached.size;) {
      before = reached.size
      for (const { actor, from, action } of everything(kind)) {
        const to = statusAfter(kind, actor, from, action)
        if (reached.has(from) && to) reached.add(to)
      }
    }
    expect([...reached].sort()).toEqual([...statuses].sort())
  })
})

describe('whoever holds a private link', () => {
  it('may do nothing that the contractor may not', () => {
    for (const kind of KINDS) {
      for (const { actor, from, action } of everything(kind)) {
        if (actor === 'link' && mayMove(kind, actor, from, action)) {
          expect(mayMove(kind, 'contractor', from, action)).toBe(true)
        }
      }
    }
  })
})
