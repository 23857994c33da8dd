'use client'

import { useQuery } from '@tanstack/react-query'
import { ChevronDown } from 'lucide-react'
import { useState } from 'react'
import { controlClasses } from '@/components/forms/controlClasses'
import { fetchJson } from '@/components/tables/fetchJson'
import { recomputationReply } from '@/lib/domain/reviews/recomputationSchema'
import { paths } from '@/lib/paths'
import { RecomputedRows } from './RecomputedRows'

export interface AnotherCosmologyProps {
  assignmentId: number
  stated: {
    cosmologyName: string
    neededSeconds: number
    verdict: 'feasible' | 'marginal' | 'not-feasible' | null
  }
  presets: readonly { id: string; name: string }[]
}

/** The hours and the verdict once more under another cosmology; the packet itself does not change. */
export function AnotherCosmology({ assignmentId, stated, presets }: AnotherCosmologyProps) {
  const [chosen, setChosen] = useState('')
  const { data, error, isFetching } = useQuery({
    queryKey: ['recomputed', assignmentId, chosen],
    queryFn: ({ signal }) =>
      fetchJson(paths.api.reviewRecomputed(assignmentId, chosen), recomputationReply, signal),
    enabled: chosen !== '',
    staleTime: Infinity,
  })
  return (
    <section className="mt-6 grid rounded border border-rule bg-surface md:grid-cols-[15.5rem_minmax(0,1fr)]">
      <div className="min-w-0 border-rule p-5 max-md:border-b max-sm:p-4 md:border-r">
        <h2 className="text-body font-semibold">
          <label htmlFor="cosmology">Under another cosmology</label>
        </h2>
        <div className="relative mt-3">
          <select
            id="cosmology"
            value={chosen}
            onChange={(event) => setChosen(event.target.value)}
            className={`${controlClasses(false, false)} appearance-none pr-9 text-table`}
          >
            <option value="">As stated, {stated.cosmologyName}</option>
            {presets.map(({ id, name }) => (
              <option key={id} value={id}>
                {name}
              </option>
            ))}
          </select>
          <ChevronDown
            size={16}
            aria-hidden="true"
            className="pointer-events-none absolute top-1/2 right-3 -translate-y-1/2"
          />
        </div>
        <p className="mt-2 text-caption text-muted">The packet itself does not change.</p>
      </div>
      <div className="min-w-0 overflow-x-auto p-5 max-sm:p-4" aria-live="polite" aria-busy={isFetching}>
        {error ? (
          <p className="m-0 text-table font-semibold text-not-feasible">{error.message}</p>
        ) : (
          <RecomputedRows stated={stated} again={chosen ? (data ?? null) : null} isComputing={isFetching} />
        )}
      </div>
    </section>
  )
}
