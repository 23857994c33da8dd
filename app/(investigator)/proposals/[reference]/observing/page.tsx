import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { ObservingEditor } from '@/components/observations/ObservingEditor'
import { SectionFoot } from '@/components/proposals/SectionFoot'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { markSectionDoneAction } from '../actions'
import { CarriedHere } from '../CarriedHere'
import { unwritten } from '@/lib/domain/proposals/unwritten'
import { proposalOf } from '../proposalOf'
import {
  addObservationAction,
  askForAction,
  removeObservationAction,
  saveConstraintSetAction,
  saveObservationAction,
  saveWishAction,
} from './actions'

export const metadata: Metadata = { title: 'Observing' }

export default async function ObservingPage({ params }: { params: Promise<{ reference: string }> }) {
  await openPage('/proposals/[reference]/observing')
  const { contents, computation, readOnly } = await orNotFound(proposalOf((await params).reference))
  return (
    <Main>
      <ObservingEditor
        contents={{ ...contents, people: [], papers: [], writings: unwritten, figures: [] }}
        computation={computation}
        readOnly={readOnly}
        note={<CarriedHere reference={contents.reference} section="observing" />}
        actions={{
          add: addObservationAction,
          save: saveObservationAction,
          ask: askForAction,
          remove: removeObservationAction,
          saveConstraints: saveConstraintSetAction,
          saveWish: saveWishAction,
        }}
      />
      <SectionFoot
        reference={contents.reference}
        section="observing"
        done={contents.sectionsDone.includes('observing')}
        offReason={readOnly}
        mark={markSectionDoneAction}
      />
    </Main>
  )
}
