import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { QuestionForm, type QuestionValues } from '@/components/proposals/QuestionForm'
import { ReadOnlyNote } from '@/components/proposals/ReadOnlyNote'
import { SectionFoot } from '@/components/proposals/SectionFoot'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { markSectionDoneAction } from '../actions'
import { CarriedHere } from '../CarriedHere'
import { proposalOf } from '../proposalOf'
import { saveQuestionAction } from './actions'

export const metadata: Metadata = { title: 'Question' }

export default async function QuestionPage({ params }: { params: Promise<{ reference: string }> }) {
  await openPage('/proposals/[reference]/question')
  const { contents, readOnly } = await orNotFound(proposalOf((await params).reference))
  const { reference, title, abstract, category, kind, version } = contents
  return (
    <Main>
      <PageTitle title="Question" lead="What is to be found out, in the words reviewers read first." />
      <div className="mt-6 max-w-prose">
        <ReadOnlyNote reason={readOnly} />
        <CarriedHere reference={reference} section="question" />
        {readOnly ? (
          <>
            <h2 className="text-h2">{title || 'Without a title'}</h2>
            <p className="mt-1 text-muted">{category || 'No category'}</p>
            <p className="mt-4 whitespace-pre-line">{abstract || 'No abstract.'}</p>
          </>
        ) : (
          <QuestionForm
            reference={reference}
            version={version}
            abstractLimit={kind.abstractLimit}
            kept={{ title, abstract, category: category as QuestionValues['category'] }}
            save={saveQuestionAction}
          />
        )}
      </div>
      <SectionFoot
        reference={reference}
        section="question"
        done={contents.sectionsDone.includes('question')}
        offReason={readOnly}
        mark={markSectionDoneAction}
      />
    </Main>
  )
}
