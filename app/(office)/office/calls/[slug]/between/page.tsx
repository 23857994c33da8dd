import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { SharingBoard } from '@/components/sharing/SharingBoard'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readSharing } from '@/lib/domain/sharing/readSharing'
import { paths } from '@/lib/paths'
import { saveShareRuleAsOfficeAction } from './actions'

export const metadata: Metadata = { title: 'Between panels' }

export default async function OfficeBetweenPanelsPage({ params }: { params: Promise<{ slug: string }> }) {
  const ctx = await openPage('/office/calls/[slug]/between')
  const { slug } = await params
  const view = await orNotFound(readSharing(ctx, slug))
  return (
    <Main>
      <Breadcrumb
        steps={[
          { label: 'Calls', href: paths.office('calls') },
          { label: `Call ${view.callNumber}`, href: paths.officeCall(slug) },
          { label: 'Between panels' },
        ]}
      />
      <SharingBoard
        view={view}
        saveRule={saveShareRuleAsOfficeAction}
        meeting={null}
        back={{ href: paths.officeCallPage(slug, 'rules'), words: 'Go to the rules of the call' }}
      />
    </Main>
  )
}
