import type { Actor, Kind, StatusOf } from './statuses.ts'

export const ACTIONS = {
  request: ['edit', 'submit', 'review', 'markQuoted', 'withdraw', 'decline', 'close'],
  revision: ['edit', 'approve', 'send', 'accept', 'decline', 'withdraw', 'revise', 'expire', 'supersede'],
  order: ['pay', 'release', 'start', 'makeReady', 'dispatch', 'complete', 'cancel'],
  payment: ['settle', 'fail', 'refundPart', 'refund', 'dispute', 'winDispute', 'loseDispute'],
} as const satisfies Record<Kind, readonly string[]>
export type ActionOf<K extends Kind> = (typeof ACTIONS)[K][number]

export interface Move<K extends Kind> {
  action: ActionOf<K>
  from: readonly StatusOf[K][]
  /** `same`: the record changes, its status does not. */
  to: StatusOf[K] | 'same'
  by: readonly Actor[]
}

const SHOP: readonly Actor[] = ['estimator', 'admin']
const CUSTOMER: readonly Actor[] = ['contractor', 'link']

/** Who may move what from where to where. The server allows by it, the client shows buttons by it. */
export const MOVES: { readonly [K in Kind]: readonly Move<K>[] } = {
  request: [
    { action: 'edit', from: ['draft'], to: 'same', by: ['contractor'] },
    { action: 'submit', from: ['draft'], to: 'submitted', by: ['contractor'] },
    { action: 'review', from: ['submitted'], to: 'in review', by: SHOP },
    { action: 'markQuoted', from: ['in review'], to: 'quoted', by: ['system'] },
    { action: 'withdraw', from: ['draft', 'submitted', 'in review'], to: 'withdrawn', by: ['contractor'] },
    { action: 'decline', from: ['submitted', 'in review'], to: 'declined', by: SHOP },
    { action: 'close', from: ['quoted'], to: 'closed', by: [...SHOP, 'system'] },
  ],
  revision: [
    { action: 'edit', from: ['draft'], to: 'same', by: SHOP },
    { action: 'approve', from: ['draft'], to: 'approved', by: SHOP },
    { action: 'send', from: ['approved'], to: 'sent', by: SHOP },
    { action: 'accept', from: ['sent'], to: 'accepted', by: CUSTOMER },
    { action: 'decline', from: ['sent'], to: 'declined', by: CUSTOMER },
    { action: 'withdraw', from: ['draft', 'approved', 'sent'], to: 'withdrawn', by: SHOP },
    // The next revision is a draft of its own; this one stays as it is until that one is sent.
    {
      action: 'revise',
      from: ['approved', 'sent', 'declined', 'expired', 'withdrawn'],
      to: 'same',
      by: SHOP,
    },
    { action: 'expire', from: ['sent'], to: 'expired', by: ['system'] },
    { action: 'supersede', from: ['approved', 'sent'], to: 'superseded', by: ['system'] },
  ],
  order: [
    { action: 'pay', from: ['awaiting deposit'], to: 'same', by: CUSTOMER },
    // By the processor's word, by accounts for a transfer or cheque, or for a company with credit terms.
    { action: 'release', from: ['awaiting deposit'], to: 'released', by: ['accounts', 'admin', 'system'] },
    { action: 'start', from: ['released'], to: 'in fabrication', by: SHOP },
    { action: 'makeReady', from: ['in fabrication'], to: 'ready', by: SHOP },
    { action: 'dispatch', from: ['ready'], to: 'dispatched', by: SHOP },
    { action: 'complete', from: ['dispatched'], to: 'completed', by: SHOP },
    { action: 'cancel', from: ['awaiting deposit'], to: 'cancelled', by: SHOP },
    // Steel may be bought by now: what is refunded is the admin's to decide.
    { action: 'cancel', from: ['released', 'in fabrication', 'ready'], to: 'cancelled', by: ['admin'] },
  ],
  payment: [
    { action: 'settle', from: ['pending'], to: 'succeeded', by: ['accounts', 'system'] },
    // A card that was refused may go through at the next try of the same checkout; money that came is never dropped.
    { action: 'settle', from: ['failed'], to: 'succeeded', by: ['system'] },
    { action: 'fail', from: ['pending'], to: 'failed', by: ['accounts', 'system'] },
    {
      action: 'refundPart',
      from: ['succeeded', 'refunded in part'],
      to: 'refunded in part',
      by: ['accounts', 'system'],
    },
    { action: 'refund', from: ['succeeded', 'refunded in part'], to: 'refunded', by: ['accounts', 'system'] },
    { action: 'dispute', from: ['succeeded', 'refunded in part'], to: 'disputed', by: ['system'] },
    { action: 'winDispute', from: ['disputed'], to: 'succeeded', by: ['system'] },
    { action: 'loseDispute', from: ['disputed'], to: 'refunded', by: ['system'] },
  ],
}
