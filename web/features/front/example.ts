import type { Column } from '../../../shared/stability/column.ts'

/** The worked example of the front page: a storey column, fixed at its base, with a girt half-way. */
export const EXAMPLE: Column = {
  height: 6400,
  ends: { strong: { bottom: 'fixed', top: 'pinned' }, weak: { bottom: 'pinned', top: 'pinned' } },
  braces: [{ height: 3200, holds: 'weak', stopsTwist: false }],
  endFixity: 'recommended',
}
