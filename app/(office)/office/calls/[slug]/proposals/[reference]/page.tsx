import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { ExtensionForm } from '@/components/office/ExtensionForm'
import { officeProposalFacts } from '@/components/office/officeProposalFacts'
import { RepairForm } from '@/components/office/RepairForm'
import { RepairList } from '@/components/office/RepairList'
import { SentVersions } from '@/components/proposals/SentVersions'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { Facts } from '@/components/ui/Facts'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readOfficeProposal } from '@/lib/domain/calls/readOfficeProposal'
import { paths } from '@/lib/paths'
import { closeRepairAction, extendProposalAction, openRepairAction } from './actions'

export const metadata: Metadata = { title: 'Proposal' }

export default async function OfficeProposalPage({
  params,
}: {
  params: Promise<{ slug: string; reference: string }>
}) {
  const ctx = await openPage('/office/calls/[slug]/proposals/[reference]')
  const { slug, reference } = await params
  const view = await orNotFound(readOfficeProposal(ctx, { slug, reference }))
  const { contents, now, deadline, versions, repairs } = view
  const offset = contents.site.utcOffsetHours
  return (
    <Main>
      <Breadcrumb
        steps={[
          { label: 'Calls', href: paths.office('calls') },
          { label: contents.call.title, href: paths.officeCall(slug) },
          { label: contents.reference },
        ]}
      />
      <PageTitle
        title={contents.title || 'A proposal without a title'}
        lead="What the office may do about one proposal: give it a deadline of its own, or have a wrong file replaced."
        actions={
          versions.length > 0 ? (
            <LinkButton look="secondary" href={paths.proposalPacket(contents.reference)} download>
              The packet, with names
            </LinkButton>
          ) : null
        }
      />
      <div className="mt-8">
        <TwoColumns
          side={
            <>
              <Facts title={contents.reference} facts={officeProposalFacts(view)} />
              <section className="mt-10">
                <SectionHeading dense title="Versions sent" />
                <SentVersions reference={contents.reference} versions={versions} />
              </section>
            </>
          }
        >
          <SectionHeading title="A deadline of its own" aside="Everyone named on it is told." />
          <div className="mt-4">
            {view.noExtension ? (
              <p className="m-0 text-muted">{view.noExtension}</p>
            ) : (
              <ExtensionForm
                reference={contents.reference}
                closesAt={deadline}
                utcOffsetHours={offset}
                action={extendProposalAction}
              />
            )}
          </div>
          <section className="mt-12">
            <SectionHeading title="A wrong file" aside="Both files are kept; the panel reads the new one." />
            <div className="mt-4">
              <RepairList
                reference={contents.reference}
                repairs={repairs}
                now={now}
                close={closeRepairAction}
              />
              {view.noRepair ? (
                <p className="m-0 text-muted">{view.noRepair}</p>
              ) : (
                <RepairForm
                  reference={contents.reference}
                  papers={contents.papers}
                  utcOffsetHours={offset}
                  action={openRepairAction}
                />
              )}
            </div>
          </section>
        </TwoColumns>
      </div>
    </Main>
  )
}
