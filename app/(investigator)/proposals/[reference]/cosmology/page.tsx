import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { CosmologyFormView } from '@/components/proposals/CosmologyFormView'
import { comparisonChoices, cosmologyChoices } from '@/components/proposals/cosmologyOptions'
import { ReadOnlyNote } from '@/components/proposals/ReadOnlyNote'
import { SectionFoot } from '@/components/proposals/SectionFoot'
import { UniverseNote } from '@/components/proposals/UniverseNote'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { cosmologyFormOf } from '@/lib/domain/proposals/cosmologyForm'
import { markSectionDoneAction } from '../actions'
import { proposalOf } from '../proposalOf'
import { saveCosmologyAction } from './actions'

export const metadata: Metadata = { title: 'Cosmology' }

export default async function CosmologyPage({ params }: { params: Promise<{ reference: string }> }) {
  await openPage('/proposals/[reference]/cosmology')
  const { contents, readOnly } = await orNotFound(proposalOf((await params).reference))
  const { reference, cosmology, version } = contents
  const kept = cosmologyFormOf(cosmology)
  return (
    <Main>
      <PageTitle
        title="Cosmology"
        lead="A redshift becomes a distance only under a cosmology. The packet names the one you choose."
      />
      <div className="mt-6">
        <ReadOnlyNote reason={readOnly} />
        {readOnly ? (
          <div className="max-w-lg">
            <h2 className="mb-3 text-h2">{cosmology.parameters.name}</h2>
            <UniverseNote form={kept} />
          </div>
        ) : (
          <CosmologyFormView
            reference={reference}
            version={version}
            kept={kept}
            choices={cosmologyChoices}
            comparisons={comparisonChoices}
            save={saveCosmologyAction}
          />
        )}
      </div>
      <SectionFoot
        reference={reference}
        section="cosmology"
        done={contents.sectionsDone.includes('cosmology')}
        offReason={readOnly}
        mark={markSectionDoneAction}
      />
    </Main>
  )
}
