import type { OrderDto } from '../../../shared/contracts/orders.ts'
import { ORDER_STATUSES } from '../../../shared/quoting/statuses.ts'

export interface Station {
  status: OrderDto['status']
  state: 'done' | 'here' | 'ahead'
  at: string | null
  by: string | null
}

/** The way of an order, top to bottom: what it has passed, where it is, what is ahead. */
export function stationsOf({ status, progress }: Pick<OrderDto, 'status' | 'progress'>): Station[] {
  const passed = new Map(progress.map((step) => [step.status, step]))
  const way = ORDER_STATUSES.filter((each) => each !== 'cancelled')
  const stations =
    status === 'cancelled' ? [...way.filter((each) => passed.has(each)), 'cancelled' as const] : way
  const here = stations.indexOf(status)
  return stations.map((each, index) => ({
    status: each,
    state: index < here ? 'done' : index === here ? 'here' : 'ahead',
    at: passed.get(each)?.at ?? null,
    by: passed.get(each)?.by ?? null,
  }))
}
