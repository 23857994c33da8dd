import { randomUUID } from 'node:crypto'
import type { Metadata } from 'next'
import { FeePanel } from '@/components/fees/FeePanel'
import { SendForm } from '@/components/fees/SendForm'
import { Main } from '@/components/layout/Main'
import { TwoColumns } from '@/components/layout/TwoColumns'
import { AlreadySent } from '@/components/submission/AlreadySent'
import { MissingPanel } from '@/components/submission/MissingPanel'
import { ReadThrough } from '@/components/submission/ReadThrough'
import { WhatSendingDoes } from '@/components/submission/WhatSendingDoes'
import { PageTitle } from '@/components/ui/PageTitle'
import { Panel } from '@/components/ui/Panel'
import { formatEngine } from '@/lib/format'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { leftOut, namedOnSending } from '@/lib/domain/proposals/namedOnSending'
import { declarationFor, leadFor } from '@/lib/domain/submission/sendWords'
import { readForSending, type ForSending } from '@/lib/domain/submission/readForSending'
import { reopenProposal } from '@/app/(investigator)/(confirmation)/proposals/[reference]/sent/actions'
import { CarriedHere } from '../CarriedHere'
import { proposalOf } from '../proposalOf'
import { sendProposal } from './actions'

export const metadata: Metadata = { title: 'Read it through and send' }

interface Props {
  params: Promise<{ reference: string }>
}

export default async function SendPage({ params }: Props) {
  const ctx = await openPage('/proposals/[reference]/send')
  const { reference } = await params
  const read = await orNotFound(proposalOf(reference).then((found) => readForSending(ctx, found)))
  const { contents, computation } = read
  return (
    <Main>
      <TwoColumns
        side={
          <>
            <Sending read={read} isTestMode={ctx.payments.isTestMode} />
            {read.isIn ? null : (
              <WhatSendingDoes
                reference={contents.reference}
                engine={formatEngine(computation.engineVersion)}
                deadline={read.deadline}
                feeDueAt={read.due?.dueAt ?? null}
              />
            )}
          </>
        }
      >
        <PageTitle title="Read it through" lead={leadFor(read)} />
        <div className="mt-6">
          <CarriedHere reference={contents.reference} section="send" />
          <ReadThrough
            reference={contents.reference}
            groups={read.groups}
            verdict={computation.verdict}
            readOnly={read.readOnly !== null}
          />
        </div>
      </TwoColumns>
    </Main>
  )
}

/** The one panel that wants action: what is missing, why not, or the button. */
function Sending({ read, isTestMode }: { read: ForSending; isTestMode: boolean }) {
  const { contents, due: fee } = read
  const { reference } = contents
  if (read.isIn)
    return <AlreadySent reference={reference} mayReopen={read.mayReopen} action={reopenProposal} />
  if (read.whyNot) {
    return (
      <Panel bar="lamp" title="It cannot be sent from here">
        <p className="m-0">{read.whyNot}</p>
      </Panel>
    )
  }
  if (read.missing.length > 0) return <MissingPanel missing={read.missing} />
  const form = (
    <SendForm
      reference={reference}
      idempotencyKey={randomUUID()}
      declaration={declarationFor(namedOnSending(contents.people).length)}
      leftOut={leftOut(contents.people).map(({ name }) => name)}
      fee={fee}
      action={sendProposal}
    />
  )
  if (!fee) {
    return (
      <Panel bar="lamp" title="Send it">
        {form}
      </Panel>
    )
  }
  const label = `${contents.kind.title}, call ${contents.call.number}`
  return (
    <FeePanel label={label} fee={fee} deadline={read.deadline} isTestMode={isTestMode}>
      {form}
    </FeePanel>
  )
}
