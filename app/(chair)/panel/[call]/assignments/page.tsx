import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { AssignmentsBoard } from '@/components/panel/AssignmentsBoard'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readAssignments } from '@/lib/domain/assignments/readAssignments'
import { panelKey, type PanelPageProps } from '../panelKey'
import {
  assignReviewersAction,
  changeSeatAction,
  moveReaderAction,
  replaceReviewerAction,
  startReviewAction,
  suggestAction,
  takeOffAction,
} from './actions'

export const metadata: Metadata = { title: 'Assignments' }

export default async function AssignmentsPage(props: PanelPageProps) {
  const ctx = await openPage('/panel/[call]/assignments')
  const view = await orNotFound(readAssignments(ctx, await panelKey(props)))
  return (
    <Main>
      <AssignmentsBoard
        key={view.panelId}
        initial={view}
        actions={{
          startReview: startReviewAction,
          assign: assignReviewersAction,
          takeOff: takeOffAction,
          changeSeat: changeSeatAction,
          move: moveReaderAction,
          replace: replaceReviewerAction,
          suggest: suggestAction,
        }}
      />
    </Main>
  )
}
