'use client'

import { useEffect } from 'react'
import { useDeed } from '@/components/panel/useDeed'
import type { ActionResult } from '@/lib/actions/result'
import type { DecisionRow } from '@/lib/domain/decisions/decisionsView'
import type { OpenInput } from '@/lib/domain/decisions/schema'
import { needsOpening } from './unopened'

export type OpenAction = (input: OpenInput) => Promise<ActionResult<void>>

/** Tells the observatory that a decision is before its second person, again whenever it changes meanwhile. */
export function useOpening(row: DecisionRow, panelId: number, open: OpenAction): void {
  const { deed } = useDeed()
  const { proposalId, version } = row
  const isNew = needsOpening(row)
  useEffect(() => {
    if (isNew) deed(`open-${proposalId}-${version}`, () => open({ panelId, proposalId, version }))
    // The deed is made anew with every drawing; it is asked for once a version.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [isNew, panelId, proposalId, version])
}
