'use client'

import { useDeferredValue, useEffect, useMemo } from 'react'
import { computeProposal, cosmologyOf, takeOver } from '@/lib/domain/observations/rules'
import type { ProposalComputation } from '@/lib/domain/observations/types'
import type { ProposalContents } from '@/lib/domain/proposals/types'

/**
 * The numbers of a proposal while it is being typed, by the same code the server runs. What the server computed is
 * taken over, so that a change to one row computes that row alone; the server confirms it with the next save.
 */
export function useLiveComputation(
  saved: ProposalContents,
  confirmed: ProposalComputation,
  typed: ProposalContents,
): ProposalComputation {
  const shown = useDeferredValue(typed)

  useEffect(() => {
    takeOver(saved, confirmed, cosmologyOf(saved.cosmology.parameters))
  }, [saved, confirmed])

  return useMemo(() => (shown === saved ? confirmed : computeProposal(shown)), [shown, saved, confirmed])
}
