import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { alsoLimited } from '@/components/calls/limitWords'
import { PaperSlot } from '@/components/proposals/PaperSlot'
import { ReadOnlyNote } from '@/components/proposals/ReadOnlyNote'
import { ReplacePaper } from '@/components/proposals/ReplacePaper'
import { SectionFoot } from '@/components/proposals/SectionFoot'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { mayReplacePaper } from '@/lib/domain/papers/policy'
import { isWaiting } from '@/lib/domain/papers/repairRules'
import { readRepairs } from '@/lib/domain/papers/readRepairs'
import { maxExpertisePages } from '@/lib/domain/papers/limits'
import { readPaperNames } from '@/lib/domain/papers/readPaperNames'
import { markSectionDoneAction } from '../actions'
import { proposalOf } from '../proposalOf'
import { removePaperAction, replacePaperAction, uploadPaperAction } from './actions'

export const metadata: Metadata = { title: 'Papers' }

export default async function PapersPage({ params }: { params: Promise<{ reference: string }> }) {
  const ctx = await openPage('/proposals/[reference]/papers')
  const { contents, readOnly, now } = await orNotFound(proposalOf((await params).reference))
  const { reference, papers, people, kind } = contents
  const justification = papers.find((paper) => paper.kind === 'justification') ?? null
  const repairs = mayReplacePaper(ctx.actor, contents).allowed
    ? (await readRepairs(ctx, reference)).filter((repair) => isWaiting(repair, now))
    : []
  const actions = readOnly ? null : { upload: uploadPaperAction, remove: removePaperAction }
  return (
    <Main>
      <PageTitle
        title="Papers"
        lead="What the form cannot hold, as PDF files. A new file takes the place of the old."
      />
      <div className="mt-6 max-w-3xl">
        <ReadOnlyNote reason={readOnly} />
        {repairs.map((repair) => (
          <ReplacePaper key={repair.id} reference={reference} repair={repair} replace={replacePaperAction} />
        ))}
        <PaperSlot
          reference={reference}
          kind="justification"
          title="Justification"
          help="A PDF of at most 20 MB, without names, scripts or passwords. It goes into the packet reviewers read."
          pageLimit={kind.pageLimit}
          alsoLimited={alsoLimited(kind)}
          paper={justification}
          names={justification ? await readPaperNames(ctx, justification, people) : undefined}
          actions={actions}
        />
        <PaperSlot
          reference={reference}
          kind="team-expertise"
          title="The team’s expertise (optional)"
          help="A PDF on who you are and what you have done. It is opened only after the ranking is settled."
          pageLimit={maxExpertisePages}
          paper={papers.find((paper) => paper.kind === 'team-expertise') ?? null}
          actions={actions}
        />
      </div>
      <SectionFoot
        reference={reference}
        section="papers"
        done={contents.sectionsDone.includes('papers')}
        offReason={readOnly}
        mark={markSectionDoneAction}
      />
    </Main>
  )
}
