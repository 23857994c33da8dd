import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { ProgressBoard } from '@/components/panel/ProgressBoard'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readAssignments } from '@/lib/domain/assignments/readAssignments'
import { panelKey, type PanelPageProps } from '../panelKey'
import { remindReviewerAction } from './actions'

export const metadata: Metadata = { title: 'Progress' }

export default async function ProgressPage(props: PanelPageProps) {
  const ctx = await openPage('/panel/[call]/progress')
  const view = await orNotFound(readAssignments(ctx, await panelKey(props)))
  return (
    <Main>
      <ProgressBoard key={view.panelId} initial={view} remind={remindReviewerAction} />
    </Main>
  )
}
