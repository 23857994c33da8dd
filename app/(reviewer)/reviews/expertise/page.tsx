import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { ExpertiseForm } from '@/components/reviews/ExpertiseForm'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readExpertise } from '@/lib/domain/expertise/readExpertise'
import { paths } from '@/lib/paths'
import { saveExpertiseAction } from './actions'

export const metadata: Metadata = { title: 'What you know' }

export default async function ExpertisePage() {
  const ctx = await openPage('/reviews/expertise')
  const { values } = await readExpertise(ctx)
  return (
    <Main>
      <Breadcrumb steps={[{ label: 'Reviews', href: paths.reviews() }, { label: 'What you know' }]} />
      <PageTitle
        title="What do you know best?"
        lead="Proposals are given to readers who know their subject. Chairs see what follows from it for each proposal; investigators and colleagues do not."
      />
      <div className="mt-6 max-w-prose">
        <ExpertiseForm values={values} action={saveExpertiseAction} />
      </div>
    </Main>
  )
}
