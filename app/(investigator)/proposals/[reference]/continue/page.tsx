import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { ContinueForm } from '@/components/proposals/ContinueForm'
import { kindWords } from '@/components/proposals/kindWords'
import { BarNote } from '@/components/ui/BarNote'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readContinuation } from '@/lib/domain/continuation/readContinuation'
import { namedOnSending } from '@/lib/domain/proposals/namedOnSending'
import { countInWords, formatList } from '@/lib/format'
import { paths } from '@/lib/paths'
import { continueProposalAction } from './actions'

export const metadata: Metadata = { title: 'Carry it on' }

export default async function ContinuePage({ params }: { params: Promise<{ reference: string }> }) {
  const ctx = await openPage('/proposals/[reference]/continue')
  const { contents, kinds, whyNot } = await orNotFound(readContinuation(ctx, (await params).reference))
  const { reference, title, targets, observations, papers, people } = contents
  const others = namedOnSending(people).filter(({ personId }) => personId !== ctx.actor.personId)
  const calls = new Set(kinds.map(({ call }) => call.id))
  return (
    <Main>
      <Breadcrumb
        steps={[
          { label: 'My proposals', href: paths.proposals() },
          { label: title || 'Without a title', href: paths.proposal(reference) },
          { label: 'Carry it on' },
        ]}
      />
      <PageTitle
        title={`Carry ${reference} on in another call`}
        lead="A new proposal of the same programme, begun with what this one says. This one stays as it is."
      />
      <div className="mt-6 max-w-2xl">
        {whyNot ? (
          <BarNote tone="lamp">
            <p className="m-0">{whyNot}</p>
          </BarNote>
        ) : (
          <>
            <ul className="mt-0 mb-8 max-w-prose list-disc pl-5">
              <li>
                Title, abstract and cosmology, {countInWords(targets.length, 'target')},{' '}
                {countInWords(observations.length, 'observation')} and {countInWords(papers.length, 'paper')}{' '}
                come along.
              </li>
              <li>
                Modes, records and limits are held against the new call; what differs is listed where it is
                mended.
              </li>
              <li>
                {others.length > 0
                  ? `You lead it. ${formatList(others.map(({ name }) => name))} must agree anew, and ${others.length === 1 ? 'is' : 'are'} written to at once.`
                  : 'You lead it.'}
              </li>
            </ul>
            <ContinueForm
              reference={reference}
              action={continueProposalAction}
              kinds={kinds.map((one) => ({
                value: String(one.kind.id),
                label: calls.size === 1 ? one.kind.title : `${one.kind.title}, ${one.call.title}`,
                help: kindWords(one),
              }))}
              chosen={String(kinds.find(({ kind }) => kind.kind === contents.kind.kind)?.kind.id ?? '')}
            />
          </>
        )}
      </div>
    </Main>
  )
}
