import { ACTIONS, MOVES, type ActionOf, type Move } from './moves.ts'
import type { Actor, Kind, StatusOf } from './statuses.ts'

function findMove<K extends Kind>(
  kind: K,
  actor: Actor,
  from: StatusOf[K],
  action: ActionOf<K>,
): Move<K> | undefined {
  const moves: readonly Move<K>[] = MOVES[kind]
  return moves.find((move) => move.action === action && move.from.includes(from) && move.by.includes(actor))
}

export function mayMove<K extends Kind>(
  kind: K,
  actor: Actor,
  from: StatusOf[K],
  action: ActionOf<K>,
): boolean {
  return findMove(kind, actor, from, action) !== undefined
}

/** The status after a move; undefined when it is not allowed. */
export function statusAfter<K extends Kind>(
  kind: K,
  actor: Actor,
  from: StatusOf[K],
  action: ActionOf<K>,
): StatusOf[K] | undefined {
  const move = findMove(kind, actor, from, action)
  return move && (move.to === 'same' ? from : move.to)
}

/** What somebody may do with a record now, in the order of the table. */
export function actionsFor<K extends Kind>(kind: K, actor: Actor, status: StatusOf[K]): ActionOf<K>[] {
  const actions: readonly ActionOf<K>[] = ACTIONS[kind]
  return actions.filter((action) => mayMove(kind, actor, status, action))
}

/**
 * Why a move is not allowed: `role` when the actor never may, `status` when not as things stand. Undefined when it is.
 */
export function moveFault<K extends Kind>(
  kind: K,
  actor: Actor,
  from: StatusOf[K],
  action: ActionOf<K>,
): 'role' | 'status' | undefined {
  if (mayMove(kind, actor, from, action)) return undefined
  const moves: readonly Move<K>[] = MOVES[kind]
  const ever = moves.some((move) => move.action === action && move.by.includes(actor))
  return ever ? 'status' : 'role'
}
