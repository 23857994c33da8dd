import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { ClashNotes } from '@/components/observations/ClashNotes'
import { FeasibilityReport } from '@/components/observations/FeasibilityReport'
import { OtherCosmologies } from '@/components/observations/OtherCosmologies'
import { SectionFoot } from '@/components/proposals/SectionFoot'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readOutcome } from '@/lib/domain/decisions/readOutcome'
import { isOutcome } from '@/lib/domain/decisions/rules'
import { readClashes } from '@/lib/domain/observations/readClashes'
import { standingComputation } from '@/lib/domain/observations/standingComputation'
import { underCosmology } from '@/lib/domain/observations/underCosmology'
import { paths } from '@/lib/paths'
import { markSectionDoneAction } from '../actions'
import { proposalOf } from '../proposalOf'

export const metadata: Metadata = { title: 'Feasibility' }

interface Props {
  params: Promise<{ reference: string }>
  searchParams: Promise<{ observation?: string; under?: string }>
}

export default async function FeasibilityPage({ params, searchParams }: Props) {
  const ctx = await openPage('/proposals/[reference]/feasibility')
  const [{ reference }, query] = await Promise.all([params, searchParams])
  const read = await orNotFound(proposalOf(reference))
  const { contents, readOnly } = read
  const computation = await standingComputation(ctx, read)
  const outcome = isOutcome(contents.state) ? await readOutcome(ctx, contents.reference) : null
  const here = paths.proposalSection(contents.reference, 'feasibility')
  const other = query.under ? underCosmology(contents, computation, query.under) : null
  const hrefOf = (id: number) => `${here}?observation=${id}${other ? `&under=${other.id}` : ''}`
  const chosen = Number(query.observation) || null
  return (
    <Main>
      <PageTitle
        title="Feasibility"
        lead="Can it be done? A planning estimate: the instrument scientists have the last word."
        actions={
          contents.observations.length === 0 ? (
            <LinkButton href={paths.proposalSection(contents.reference, 'observing')}>
              Say what is to be observed
            </LinkButton>
          ) : undefined
        }
      />
      <div className="mt-6">
        <ClashNotes contents={contents} clashes={await readClashes(ctx, contents)} />
        <FeasibilityReport
          contents={other?.contents ?? contents}
          computation={other?.computation ?? computation}
          chosen={chosen}
          hrefOf={hrefOf}
          assessments={outcome?.decision?.assessments}
          aside={
            <OtherCosmologies
              here={`${here}?observation=${chosen ?? ''}`}
              own={computation.cosmologyName}
              engineVersion={computation.engineVersion}
              other={other ? { id: other.id, name: other.name, flips: other.flips } : null}
            />
          }
        />
      </div>
      {contents.observations.length > 0 ? (
        <SectionFoot
          reference={contents.reference}
          section="feasibility"
          done={contents.sectionsDone.includes('feasibility')}
          offReason={readOnly}
          mark={markSectionDoneAction}
        />
      ) : null}
    </Main>
  )
}
