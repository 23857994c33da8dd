import type { Metadata } from 'next'
import { BandExplained } from '@/components/help/BandExplained'
import { CosmologyTable } from '@/components/help/CosmologyTable'
import { cosmologyRows } from '@/components/help/cosmologyRows'
import { KeysExplained } from '@/components/help/KeysExplained'
import { PanelMarks } from '@/components/help/PanelMarks'
import { PlateSection } from '@/components/help/PlateSection'
import { PracticeForm } from '@/components/help/PracticeForm'
import { RulerPractice } from '@/components/help/RulerPractice'
import { SavingExplained } from '@/components/help/SavingExplained'
import { ScaleNumber } from '@/components/help/ScaleNumber'
import { SeasonExplained } from '@/components/help/SeasonExplained'
import { StatesExplained } from '@/components/help/StatesExplained'
import { ThemesExplained } from '@/components/help/ThemesExplained'
import { UndoPractice } from '@/components/help/UndoPractice'
import { VerdictsExplained } from '@/components/help/VerdictsExplained'
import { Main } from '@/components/layout/Main'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readFrame } from '@/lib/domain/calls/readFrame'
import { paths } from '@/lib/paths'
import { eveningDateAt } from '@/lib/science/sky'

export const metadata: Metadata = { title: 'How to read the signs' }

const nightsShown = 92
const day = 86_400_000

export default async function MarksPage() {
  const ctx = await openPage('/help/marks')
  const { site, now } = await readFrame(ctx, null)
  const from = site ? eveningDateAt(site, now) : null
  return (
    <Main>
      <Breadcrumb steps={[{ label: 'Help', href: paths.help() }, { label: 'How to read the signs' }]} />
      <PageTitle
        title="How to read the signs"
        lead="Every sign, state and control, with what it means. What can be tried here keeps nothing."
      />
      <div className="mt-8">
        {site ? (
          <PlateSection title="Night band">
            <BandExplained site={site} now={now} utcOffsetHours={site.utcOffsetHours} />
          </PlateSection>
        ) : null}
        <PlateSection title="Verdicts">
          <VerdictsExplained />
        </PlateSection>
        <PlateSection title="Sections">
          <StatesExplained />
        </PlateSection>
        <PlateSection title="Fields">
          <p className="mb-4 max-w-prose text-table text-muted">
            A field is read when you leave it. If something is to mend, the message stands between its help
            and the field, and goes as soon as it is right. Try a declination of −91.
          </p>
          <PracticeForm />
        </PlateSection>
        <PlateSection title="Scores">
          <RulerPractice />
        </PlateSection>
        <PlateSection title="Numbers">
          <p className="max-w-prose text-table">
            A computed number opens: at z = 1.290 one arcsecond spans <ScaleNumber /> kpc. Press it for the
            formula, what went in, the same under another cosmology, and the source.
          </p>
        </PlateSection>
        <PlateSection title="Tables">
          <p className="mb-4 max-w-prose text-table text-muted">
            Tinted columns are computed. A head sorts, the box searches, and the address keeps both: a copied
            link shows the same rows. CSV holds what is shown.
          </p>
          <CosmologyTable rows={cosmologyRows()} />
        </PlateSection>
        {site && from ? (
          <PlateSection title="Seasons">
            <SeasonExplained
              site={site}
              from={from}
              to={new Date(Date.parse(from) + (nightsShown - 1) * day).toISOString().slice(0, 10)}
              utcOffsetHours={site.utcOffsetHours}
            />
          </PlateSection>
        ) : null}
        <PlateSection title="Ranks and hours">
          <PanelMarks />
        </PlateSection>
        <PlateSection title="Saving, undo">
          <SavingExplained />
          <div className="mt-4">
            <UndoPractice />
          </div>
        </PlateSection>
        <PlateSection title="Light">
          <p className="mb-4 max-w-prose text-table text-muted">
            The switch at the right of the head changes the light; this browser remembers it. Amber always
            means time: now, deadlines, the line, and what has the focus.
          </p>
          <ThemesExplained />
        </PlateSection>
        <PlateSection title="Keys">
          <KeysExplained />
        </PlateSection>
      </div>
    </Main>
  )
}
