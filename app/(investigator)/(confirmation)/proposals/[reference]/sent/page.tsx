import type { Metadata } from 'next'
import { FeeDue } from '@/components/fees/FeeDue'
import { NightOfReceipt } from '@/components/fees/NightOfReceipt'
import { ReceiptFacts } from '@/components/fees/ReceiptFacts'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { SentHead } from '@/components/submission/SentHead'
import { WayBack } from '@/components/submission/WayBack'
import { WeeksAhead } from '@/components/submission/WeeksAhead'
import { TextLink } from '@/components/ui/TextLink'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readSent } from '@/lib/domain/submission/readSent'
import { weeksAhead } from '@/lib/domain/submission/weeksAhead'
import { officeAddress } from '@/lib/office'
import { askForInvoice, askForWaiver, reopenProposal, startPayment, withdrawProposal } from './actions'

interface Props {
  params: Promise<{ reference: string }>
  searchParams: Promise<{ fee?: string | string[] }>
}

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: `${(await params).reference} is in` }
}

export default async function SentPage({ params, searchParams }: Props) {
  const ctx = await openPage('/proposals/[reference]/sent')
  const { reference } = await params
  const sent = await orNotFound(readSent(ctx, reference))
  const { contents, version, deadline } = sent
  const snapshot = version.snapshot.contents
  const lead = contents.people.find(({ role }) => role === 'pi')
  return (
    <Main>
      <TwoColumns
        side={
          <>
            <FeeDue
              sent={sent}
              isUnanswered={(await searchParams).fee === 'unanswered'}
              isTestMode={ctx.payments.isTestMode}
              pay={startPayment}
              ask={askForWaiver}
              invoice={askForInvoice}
            />
            <ReceiptFacts sent={sent} />
          </>
        }
      >
        <SentHead sent={sent} />
      </TwoColumns>
      <div className="mt-11">
        <NightOfReceipt site={snapshot.site} receivedAt={version.arrivedAt} />
      </div>
      <div className="mt-11">
        <TwoColumns
          side={
            <>
              <section className="border-t border-rule pt-3 text-table">
                <h2 className="mb-1 text-body font-semibold">If something is amiss</h2>
                <p className="m-0">
                  Time-allocation office,{' '}
                  <TextLink href={`mailto:${officeAddress}`}>{officeAddress}</TextLink>. Name{' '}
                  {contents.reference}. This page stays at its address.
                </p>
              </section>
              <WayBack
                reference={contents.reference}
                fee={sent.fee?.state ?? null}
                isEarly={sent.now < deadline}
                may={sent.may}
                reopen={reopenProposal}
                withdraw={withdrawProposal}
              />
            </>
          }
        >
          <WeeksAhead dates={weeksAhead(contents, deadline, { email: lead?.email ?? ctx.actor.email })} />
        </TwoColumns>
      </div>
    </Main>
  )
}
