import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { PaperSlot } from '@/components/proposals/PaperSlot'
import { ReadOnlyNote } from '@/components/proposals/ReadOnlyNote'
import { Recognisable } from '@/components/proposals/Recognisable'
import { ReplacePaper } from '@/components/proposals/ReplacePaper'
import { SectionFoot } from '@/components/proposals/SectionFoot'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { Justification } from '@/components/writing/Justification'
import { TeamWords } from '@/components/writing/TeamWords'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readGiveaways } from '@/lib/domain/anonymity/readGiveaways'
import { maxExpertisePages } from '@/lib/domain/papers/limits'
import { mayReplacePaper } from '@/lib/domain/papers/policy'
import { isWaiting } from '@/lib/domain/papers/rules'
import { readRepairs } from '@/lib/domain/papers/readRepairs'
import { readBibtex } from '@/lib/domain/writings/readBibtex'
import { markSectionDoneAction } from '../actions'
import { CarriedHere } from '../CarriedHere'
import { proposalOf } from '../proposalOf'
import {
  moveFigureAction,
  removeFigureAction,
  removePaperAction,
  saveFigureAction,
  saveWritingAction,
} from './actions'

export const metadata: Metadata = { title: 'Papers' }

const figures = {
  save: saveFigureAction,
  move: moveFigureAction,
  remove: removeFigureAction,
}

export default async function PapersPage({ params }: { params: Promise<{ reference: string }> }) {
  const ctx = await openPage('/proposals/[reference]/papers')
  const { contents, readOnly, now } = await orNotFound(proposalOf((await params).reference))
  const { reference, papers, kind, writings } = contents
  const repairs = mayReplacePaper(ctx.actor, contents).allowed
    ? (await readRepairs(ctx, reference)).filter((repair) => isWaiting(repair, now))
    : []
  const recognised = await readGiveaways(ctx, contents)
  const paperOf = (which: 'justification' | 'team-expertise') =>
    papers.find((paper) => paper.kind === which) ?? null
  const actions = readOnly ? null : { remove: removePaperAction }
  return (
    <Main>
      <PageTitle title="Papers" lead="The justification, written here or as a PDF, and who you are." />
      <div className="mt-6">
        <ReadOnlyNote reason={readOnly} />
        {repairs.map((repair) => (
          <ReplacePaper key={repair.id} reference={reference} repair={repair} />
        ))}
        <CarriedHere reference={reference} section="papers" />
        <Justification
          contents={contents}
          list={readBibtex(writings.references.text)}
          actions={readOnly ? null : { save: saveWritingAction, figures }}
        />
        <div className="max-w-3xl">
          <PaperSlot
            reference={reference}
            kind="justification"
            title="As a PDF instead"
            help="At most 20 MB, without names, scripts or passwords. It takes the place of the text, its figures and references."
            pageLimit={kind.pageLimit}
            paper={paperOf('justification')}
            actions={actions}
          />
          <section className="mb-10">
            <SectionHeading dense title="Without names" aside="title, abstract and all of the above" />
            <div className="mt-3">
              <Recognisable {...recognised} />
            </div>
          </section>
        </div>
        <TeamWords
          reference={reference}
          kept={writings.team}
          isDocument={paperOf('team-expertise') !== null}
          save={readOnly ? null : saveWritingAction}
        />
        <div className="max-w-3xl">
          <PaperSlot
            reference={reference}
            kind="team-expertise"
            title="On the team, as a PDF instead"
            help="It takes the place of the words on the team, and is opened to the panel only after its ranking is frozen."
            pageLimit={maxExpertisePages}
            paper={paperOf('team-expertise')}
            actions={actions}
          />
        </div>
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
