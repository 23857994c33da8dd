import type { SeasonPlan } from '@/lib/panel/nights/seasonTypes'
import { simulateSeasons } from '@/lib/panel/nights/simulateSeasons'
import type { SeasonsMessage } from './startSeasons'

/** Runs in a thread of the browser: a plan in, how far it is, and at last what becomes of each award. */
const port = self as unknown as {
  onmessage: (event: MessageEvent<{ plan: SeasonPlan; seed: number; seasons: number }>) => void
  postMessage: (message: SeasonsMessage) => void
}

port.onmessage = ({ data: { plan, ...options } }) => {
  const outlook = simulateSeasons(plan, options, (done) => port.postMessage({ done }))
  port.postMessage({ outlook })
}
