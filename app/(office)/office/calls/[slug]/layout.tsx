import type { ReactNode } from 'react'
import { SectionLinks } from '@/components/layout/SectionLinks'
import { openPage } from '@/lib/auth/openPage'
import { hasSeveralPanels } from '@/lib/domain/panels/hasSeveralPanels'
import { paths } from '@/lib/paths'

/** What the office does about one call, a page each. */
export default async function OfficeCallLayout({
  children,
  params,
}: {
  children: ReactNode
  params: Promise<{ slug: string }>
}) {
  const ctx = await openPage('/office/calls/[slug]')
  const { slug } = await params
  const isShared = await hasSeveralPanels(ctx, slug)
  return (
    <>
      <SectionLinks
        label="Sections of the call"
        links={[
          { href: paths.officeCall(slug), label: 'Call' },
          { href: paths.officeCallPage(slug, 'rules'), label: 'Rules' },
          { href: paths.officeCallPage(slug, 'nights'), label: 'Night calendar' },
          ...(isShared ? [{ href: paths.officeCallPage(slug, 'between'), label: 'Between panels' }] : []),
          { href: paths.officeCallPage(slug, 'figures'), label: 'Figures' },
          { href: paths.officeCallPage(slug, 'preview'), label: 'Preview' },
        ]}
        all={{ href: paths.office('calls'), label: 'All calls' }}
      />
      {children}
    </>
  )
}
