import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { RankingBoard } from '@/components/rankings/RankingBoard'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readRanking } from '@/lib/domain/rankings/readRanking'
import { panelKey, type PanelPageProps } from '../panelKey'
import {
  freezeRankingAction,
  moveInRankingAction,
  moveLineAction,
  saveFormulaAction,
  startRankingAction,
} from './actions'

export const metadata: Metadata = { title: 'Ranking' }

export default async function RankingPage(props: PanelPageProps) {
  const ctx = await openPage('/panel/[call]/ranking')
  const view = await orNotFound(readRanking(ctx, await panelKey(props)))
  return (
    <Main>
      <RankingBoard
        key={view.panelId}
        initial={view}
        actions={{
          start: startRankingAction,
          move: moveInRankingAction,
          line: moveLineAction,
          formula: saveFormulaAction,
          freeze: freezeRankingAction,
        }}
      />
    </Main>
  )
}
