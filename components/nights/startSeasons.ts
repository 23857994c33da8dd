import type { AwardOutlook, SeasonPlan } from '@/lib/panel/nights/seasonTypes'

export type SeasonsMessage = { done: number } | { outlook: AwardOutlook[] }

/** Seasons run for each award, and the seed of their weather: the same on every page. */
export const seasonsRun = { seasons: 1000, seed: 20270512 } as const

/** Runs a plan through seasons in a thread of its own; gives back how to stop it. */
export function startSeasons(
  plan: SeasonPlan,
  told: (message: SeasonsMessage | { failed: true }) => void,
): () => void {
  const worker = new Worker(new URL('./seasonsWorker.ts', import.meta.url), { type: 'module' })
  worker.onmessage = ({ data }: MessageEvent<SeasonsMessage>) => {
    told(data)
    if ('outlook' in data) worker.terminate()
  }
  worker.onerror = () => {
    told({ failed: true })
    worker.terminate()
  }
  worker.postMessage({ plan, ...seasonsRun })
  return () => worker.terminate()
}
