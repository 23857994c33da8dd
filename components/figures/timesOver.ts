import type { Pressure } from '@/lib/domain/figures/types'

/** How many times over the time on offer is asked; null where none is offered, or it is shared. */
export const timesOver = ({ askedSeconds, offeredSeconds }: Omit<Pressure, 'name'>): number | null =>
  offeredSeconds ? askedSeconds / offeredSeconds : null
