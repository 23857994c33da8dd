import type { Metadata } from 'next'
import { CriteriaForm } from '@/components/callRules/CriteriaForm'
import { KindList } from '@/components/callRules/KindList'
import { PanelList } from '@/components/callRules/PanelList'
import { CriteriaList } from '@/components/calls/CriteriaList'
import { Main } from '@/components/layout/Main'
import { BarNote } from '@/components/ui/BarNote'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readRules } from '@/lib/domain/calls/readRules'
import { countInWords } from '@/lib/format'
import {
  removeKindAction,
  removePanelAction,
  saveCriteriaAction,
  saveKindAction,
  savePanelAction,
} from './actions'

export const metadata: Metadata = { title: 'Rules of a call' }

export default async function RulesPage({ params }: { params: Promise<{ slug: string }> }) {
  const ctx = await openPage('/office/calls/[slug]/rules')
  const { slug } = await params
  const view = await orNotFound(readRules(ctx, slug))
  const { call, phase, criteria, sent } = view
  const mayChange = phase === 'planned' || phase === 'open'
  const sentWords = countInWords(sent, 'proposal has', 'proposals have', true)
  return (
    <Main>
      <PageTitle
        title={`Rules of call ${call.number}`}
        lead="What it takes, how much may be asked and said, who judges, and by what."
      />
      {mayChange ? null : (
        <div className="mt-6">
          <BarNote tone="lamp">
            <p className="m-0">The call has closed: its rules stay as they were.</p>
          </BarNote>
        </div>
      )}
      <section className="mt-8 max-w-4xl">
        <SectionHeading
          title="Kinds of proposal"
          aside={sent > 0 ? `${sentWords} been sent: no limit falls below them.` : null}
        />
        <div className="mt-3">
          <KindList view={view} mayChange={mayChange} save={saveKindAction} remove={removeKindAction} />
        </div>
      </section>
      <section className="mt-12 max-w-4xl">
        <SectionHeading title="Panels" />
        <div className="mt-3">
          <PanelList view={view} mayChange={mayChange} save={savePanelAction} remove={removePanelAction} />
        </div>
      </section>
      <section className="mt-12 max-w-4xl">
        <SectionHeading
          title="What proposals are judged by"
          aside={mayChange && sent > 0 ? `${sentWords} been sent under them: they stay.` : null}
        />
        <div className="mt-3">
          {mayChange && sent === 0 ? (
            <CriteriaForm
              call={{ slug, version: call.version }}
              criteria={criteria}
              action={saveCriteriaAction}
            />
          ) : (
            <CriteriaList criteria={criteria} />
          )}
        </div>
      </section>
    </Main>
  )
}
