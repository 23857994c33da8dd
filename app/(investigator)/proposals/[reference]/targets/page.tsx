import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { SectionFoot } from '@/components/proposals/SectionFoot'
import { TargetsEditor } from '@/components/targets/TargetsEditor'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import {
  addTargetAction,
  askTimesAction,
  changeTargetsAction,
  importTargetsAction,
  removeGroupAction,
  removeTargetAction,
  reorderTargetsAction,
  restoreTargetAction,
  saveGroupAction,
  saveTargetAction,
} from './actions'
import { markSectionDoneAction } from '../actions'
import { unwritten } from '@/lib/domain/proposals/unwritten'
import { proposalOf } from '../proposalOf'

export const metadata: Metadata = { title: 'Targets' }

export default async function TargetsPage({ params }: { params: Promise<{ reference: string }> }) {
  await openPage('/proposals/[reference]/targets')
  const { reference } = await params
  const { contents, computation, readOnly } = await orNotFound(proposalOf(reference))
  return (
    <Main>
      <TargetsEditor
        contents={{ ...contents, people: [], papers: [], writings: unwritten, figures: [] }}
        computation={computation}
        readOnly={readOnly}
        actions={{
          add: addTargetAction,
          save: saveTargetAction,
          change: changeTargetsAction,
          remove: removeTargetAction,
          restore: restoreTargetAction,
          reorder: reorderTargetsAction,
          importRows: importTargetsAction,
          saveGroup: saveGroupAction,
          removeGroup: removeGroupAction,
          ask: askTimesAction,
        }}
      />
      <SectionFoot
        reference={contents.reference}
        section="targets"
        done={contents.sectionsDone.includes('targets')}
        offReason={readOnly}
        mark={markSectionDoneAction}
      />
    </Main>
  )
}
