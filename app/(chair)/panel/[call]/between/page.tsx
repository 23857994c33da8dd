import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { SharingBoard } from '@/components/sharing/SharingBoard'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readSharing } from '@/lib/domain/sharing/readSharing'
import { paths } from '@/lib/paths'
import { panelKey, type PanelPageProps } from '../panelKey'
import { bringTogetherAction, freezeMergedAction, moveInMergedAction, saveShareRuleAction } from './actions'

export const metadata: Metadata = { title: 'Between panels' }

export default async function BetweenPanelsPage(props: PanelPageProps) {
  const ctx = await openPage('/panel/[call]/between')
  const { callSlug, panelId } = await panelKey(props)
  const view = await orNotFound(readSharing(ctx, callSlug))
  return (
    <Main>
      <SharingBoard
        view={view}
        saveRule={saveShareRuleAction}
        meeting={
          view.reader.leads
            ? { together: bringTogetherAction, move: moveInMergedAction, freeze: freezeMergedAction }
            : null
        }
        back={{ href: paths.panel(callSlug, 'ranking', panelId), words: 'Go to the ranking' }}
      />
    </Main>
  )
}
