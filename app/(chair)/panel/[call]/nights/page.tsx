import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { NightsBoard } from '@/components/nights/NightsBoard'
import { OrderNote } from '@/components/sharing/OrderNote'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { nightsPolicy } from '@/lib/domain/decisions/policyWords'
import { readNights } from '@/lib/domain/decisions/readNights'
import { isTried, trialText } from '@/lib/domain/decisions/trialSchema'
import { readOrderState } from '@/lib/domain/sharing/readOrderState'
import { paths } from '@/lib/paths'
import { panelKey, type PanelPageProps } from '../panelKey'
import {
  chooseNightsAction,
  holdHoursAction,
  saveAwardAction,
  setLeastAction,
  takePlanAction,
} from './actions'

export const metadata: Metadata = { title: 'Nights' }

const actions = {
  save: saveAwardAction,
  takePlan: takePlanAction,
  choose: chooseNightsAction,
  hold: holdHoursAction,
  setLeast: setLeastAction,
}

export default async function NightsPage(props: PanelPageProps) {
  const ctx = await openPage('/panel/[call]/nights')
  const asked = await props.searchParams
  const policy = nightsPolicy.safeParse(asked.policy)
  const text = typeof asked.trial === 'string' ? asked.trial : ''
  const read = trialText.safeParse(text)
  const trial = read.success && isTried(read.data) ? read.data : undefined
  const key = await panelKey(props)
  const view = await orNotFound(
    readNights(ctx, {
      ...key,
      policy: policy.success ? policy.data : 'rank',
      trial,
    }),
  )
  const order = await orNotFound(readOrderState(ctx, key.callSlug))
  return (
    <Main>
      {order ? <OrderNote state={order} href={paths.panel(key.callSlug, 'between', key.panelId)} /> : null}
      <NightsBoard key={view.panelId} initial={view} initialTrial={trial ? text : ''} actions={actions} />
    </Main>
  )
}
