import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { NightsBoard } from '@/components/nights/NightsBoard'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { nightsPolicy } from '@/lib/domain/decisions/nightsPolicySchema'
import { readNights } from '@/lib/domain/decisions/readNights'
import { panelKey, type PanelPageProps } from '../panelKey'
import { saveAwardAction, takePlanAction } from './actions'

export const metadata: Metadata = { title: 'Nights' }

export default async function NightsPage(props: PanelPageProps) {
  const ctx = await openPage('/panel/[call]/nights')
  const { policy } = await props.searchParams
  const asked = nightsPolicy.safeParse(policy)
  const view = await orNotFound(
    readNights(ctx, { ...(await panelKey(props)), policy: asked.success ? asked.data : 'rank' }),
  )
  return (
    <Main>
      <NightsBoard key={view.panelId} initial={view} save={saveAwardAction} takePlan={takePlanAction} />
    </Main>
  )
}
