import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { CarriedNotes } from '@/components/proposals/CarriedNotes'
import { ChangeList } from '@/components/proposals/ChangeList'
import { homeLead } from '@/components/proposals/homeLead'
import { ProgrammeList } from '@/components/proposals/ProgrammeList'
import { PutAwayButton } from '@/components/proposals/PutAwayButton'
import { SettlePanel } from '@/components/proposals/SettlePanel'
import { TargetsUp } from '@/components/proposals/TargetsUp'
import { TakeBackButton } from '@/components/proposals/TakeBackButton'
import { TaskList } from '@/components/proposals/TaskList'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { whereToContinue } from '@/lib/domain/continuation/whereToContinue'
import { readHistory } from '@/lib/domain/proposals/history/readHistory'
import { mayPutAway } from '@/lib/domain/proposals/policy'
import { paths } from '@/lib/paths'
import { ProposalQuestions } from './answers/ProposalQuestions'
import { putAwayDraftAction, takeBackDraftAction } from './actions'
import { programmeOf } from './programmeOf'
import { proposalOf } from './proposalOf'

export const metadata: Metadata = { title: 'Proposal' }

const decided = new Set<string>(['awarded', 'reserve', 'declined'])

export default async function ProposalPage({ params }: { params: Promise<{ reference: string }> }) {
  const ctx = await openPage('/proposals/[reference]')
  const read = await orNotFound(proposalOf((await params).reference))
  const { contents, now, sections } = read
  const [{ changes }, programme] = await Promise.all([
    readHistory(ctx, contents),
    programmeOf((await params).reference),
  ])
  const carryOn = await whereToContinue(ctx, contents)
  const isSent = contents.state !== 'draft' && contents.state !== 'withdrawn'
  const hasPaper = contents.papers.some(({ kind }) => kind === 'justification')
  return (
    <Main>
      <TwoColumns
        side={
          <>
            <div className="max-lg:hidden">
              <SettlePanel read={read} />
            </div>
            <section>
              <SectionHeading dense title="Latest changes" />
              <div className="mt-2">
                <ChangeList changes={changes.slice(0, 5)} now={now} />
              </div>
            </section>
            <ProgrammeList others={programme.others} />
          </>
        }
      >
        <Breadcrumb
          steps={[{ label: 'My proposals', href: paths.proposals() }, { label: contents.call.title }]}
        />
        <PageTitle display title={contents.title || 'A proposal without a title'} lead={homeLead(read)} />
        <div className="mt-6 empty:hidden">
          <ProposalQuestions ctx={ctx} reference={contents.reference} />
        </div>
        {programme.continues && programme.notes.length > 0 ? (
          <div className="mt-6 max-w-prose">
            <CarriedNotes
              notes={programme.notes}
              callNumber={programme.continues.callNumber}
              reference={contents.reference}
            />
          </div>
        ) : null}
        <div className="mt-6 lg:hidden">
          <SettlePanel read={read} />
        </div>
        <div className="mt-6">
          <TaskList reference={contents.reference} sections={sections} />
        </div>
        <div className="mt-6 flex flex-wrap items-center gap-6">
          {hasPaper ? (
            <LinkButton
              look="secondary"
              href={paths.proposalPacket(contents.reference, 'anonymised')}
              download
            >
              Read the packet as reviewers will
            </LinkButton>
          ) : null}
          {carryOn === null ? null : (
            <LinkButton look="secondary" href={paths.proposalContinue(contents.reference)}>
              Carry it on in call {carryOn}
            </LinkButton>
          )}
          {isSent ? (
            <TextLink href={paths.proposalSent(contents.reference)}>What was sent, and its fee</TextLink>
          ) : null}
          {decided.has(contents.state) ? (
            <TextLink href={paths.proposalOutcome(contents.reference)}>Outcome and feedback</TextLink>
          ) : null}
          {read.mayTakeBack ? (
            <TakeBackButton reference={contents.reference} takeBack={takeBackDraftAction} />
          ) : null}
          {mayPutAway(ctx.actor, contents).allowed ? (
            <PutAwayButton
              reference={contents.reference}
              putAway={putAwayDraftAction}
              takeBack={takeBackDraftAction}
            />
          ) : null}
        </div>
        <TargetsUp read={read} />
      </TwoColumns>
    </Main>
  )
}
