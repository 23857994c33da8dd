import type { ReactNode } from 'react'
import { CorrectionNote } from '@/components/calls/CorrectionNote'
import { ProposalSectionLinks } from '@/components/proposals/ProposalSectionLinks'
import { ProposalStrip } from '@/components/proposals/ProposalStrip'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readCorrections } from '@/lib/domain/calls/readCorrections'
import { isOutcome } from '@/lib/domain/decisions/rules'
import { isOpenForWriting } from '@/lib/domain/proposals/policy'
import { proposalOf } from './proposalOf'

/** Request strip and section links around every page of a proposal. */
export default async function ProposalLayout({
  children,
  params,
}: {
  children: ReactNode
  params: Promise<{ reference: string }>
}) {
  const ctx = await openPage('/proposals/[reference]')
  const read = await orNotFound(proposalOf((await params).reference))
  const { contents } = read
  const corrections = isOpenForWriting(contents) ? await readCorrections(ctx, contents.call.slug) : []
  return (
    <>
      <ProposalStrip read={read} />
      <ProposalSectionLinks reference={contents.reference} isDecided={isOutcome(contents.state)} />
      <CorrectionNote call={contents.call} corrections={corrections} />
      {children}
    </>
  )
}
