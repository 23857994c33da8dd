import type { Metadata } from 'next'
import { DecisionsBoard } from '@/components/decisions/DecisionsBoard'
import { Main } from '@/components/layout/Main'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readDecisions } from '@/lib/domain/decisions/readDecisions'
import { panelKey, type PanelPageProps } from '../panelKey'
import {
  approveDecisionsAction,
  openDecisionAction,
  prepareDecisionsAction,
  releaseDecisionsAction,
  saveStatementAction,
  withholdCommentAction,
} from './actions'

export const metadata: Metadata = { title: 'Decisions' }

export default async function DecisionsPage(props: PanelPageProps) {
  const ctx = await openPage('/panel/[call]/decisions')
  const view = await orNotFound(readDecisions(ctx, await panelKey(props)))
  return (
    <Main>
      <DecisionsBoard
        key={view.panelId}
        initial={view}
        prepare={prepareDecisionsAction}
        save={saveStatementAction}
        approve={approveDecisionsAction}
        openDecision={openDecisionAction}
        withhold={withholdCommentAction}
        release={releaseDecisionsAction}
      />
    </Main>
  )
}
