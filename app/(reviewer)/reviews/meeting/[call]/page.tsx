import type { Metadata } from 'next'
import { MeetingBoard } from '@/components/discussions/MeetingBoard'
import { Main } from '@/components/layout/Main'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readTable } from '@/lib/domain/discussions/readTable'
import { panelNumber } from '@/lib/domain/panels/schema'
import { leaveTableAction, scoreAgainAction, setPresenceAction } from './actions'

export const metadata: Metadata = { title: 'The meeting' }

interface Props {
  params: Promise<{ call: string }>
  searchParams: Promise<Record<string, string | string[] | undefined>>
}

export default async function MeetingPage({ params, searchParams }: Props) {
  const ctx = await openPage('/reviews/meeting/[call]')
  const [{ call }, { panel }] = await Promise.all([params, searchParams])
  const asked = panelNumber.safeParse(panel)
  const view = await orNotFound(
    readTable(ctx, { callSlug: call, ...(asked.success ? { panelId: asked.data } : {}) }),
  )
  return (
    <Main>
      <MeetingBoard
        initial={view}
        presence={setPresenceAction}
        scoreAgain={scoreAgainAction}
        leaveTable={leaveTableAction}
      />
    </Main>
  )
}
