'use client'

import { useCallback, useEffect, useRef, useState } from 'react'
import { useTableQuery } from '@/components/tables/useTableQuery'
import { seasonPlanOf, seasonsView, type SeasonsView } from '@/lib/domain/decisions/seasonsView'
import type { NightsPolicy } from '@/lib/domain/decisions/policyWords'
import type { AwardOutlook } from '@/lib/panel/nights/seasonTypes'
import { paths } from '@/lib/paths'
import { startSeasons } from './startSeasons'

export interface SeasonsAsked {
  callSlug: string
  panelId: number
  of: 'suggested' | 'given'
  policy?: NightsPolicy
  /** As it stands in the address. */
  trial?: string
  /** False where there is nothing to run. */
  isOn: boolean
}

export interface Seasons {
  state: 'reading' | 'running' | 'done' | 'stopped' | 'failed' | 'no-weather' | 'off'
  /** Seasons run so far. */
  done: number
  outlookOf: (proposalId: number, instrumentId: number) => AwardOutlook | null
  stop: () => void
  /** Runs them again, from the first. */
  again: () => void
}

interface Run {
  /** What is run; another plan or another attempt is another run. */
  plan: SeasonsView | undefined
  attempt: number
  done: number
  state: 'running' | 'done' | 'stopped' | 'failed'
  outlook: ReadonlyMap<string, AwardOutlook>
}

const keyOf = (proposal: number, instrument: number) => `${proposal} ${instrument}`
const nothing: Run['outlook'] = new Map()

/** Runs the awards of a panel through seasons of weather, beside the page; anew when what they rest on has changed. */
export function useSeasons({ callSlug, panelId, of, policy, trial, isOn }: SeasonsAsked): Seasons {
  const query = new URLSearchParams({
    ...{ call: callSlug, panel: String(panelId), of },
    ...(policy ? { policy } : {}),
    ...(trial ? { trial } : {}),
  })
  const { data: plan, isError } = useTableQuery({
    key: ['panel', 'seasons', panelId, of, policy, trial, isOn],
    url: `${paths.api.table('panel-seasons')}?${query}`,
    schema: seasonsView,
    enabled: isOn,
  })
  const [attempt, setAttempt] = useState(0)
  const begun: Run = { plan, attempt, done: 0, state: 'running', outlook: nothing }
  const [last, setRun] = useState<Run>(begun)
  const run = last.plan === plan && last.attempt === attempt ? last : begun
  const halt = useRef<() => void>(() => undefined)
  const hasWeather = plan?.hasWeather === true
  useEffect(() => {
    if (!plan || !hasWeather) return
    const tell = (next: Partial<Run>) =>
      setRun((now) => {
        const own = now.plan === plan && now.attempt === attempt ? now : null
        if (own?.state === 'stopped') return own
        return { plan, attempt, done: 0, state: 'running', outlook: nothing, ...own, ...next }
      })
    const end = startSeasons(seasonPlanOf(plan), (told) => {
      if ('failed' in told) tell({ state: 'failed' })
      else if ('done' in told) tell({ done: told.done })
      else
        tell({
          state: 'done',
          outlook: new Map(told.outlook.map((one) => [keyOf(one.proposal, one.instrument), one])),
        })
    })
    halt.current = end
    return end
  }, [plan, hasWeather, attempt])
  const { outlook } = run
  const state = !isOn
    ? 'off'
    : isError
      ? 'failed'
      : plan === undefined
        ? 'reading'
        : hasWeather
          ? run.state
          : 'no-weather'
  return {
    state,
    done: run.done,
    outlookOf: useCallback(
      (proposalId, instrumentId) => outlook.get(keyOf(proposalId, instrumentId)) ?? null,
      [outlook],
    ),
    stop: () => {
      halt.current()
      if (run.state === 'running') setRun({ ...run, state: 'stopped' })
    },
    again: () => setAttempt((count) => count + 1),
  }
}
