'use client'

import { usePanelPath } from '@/components/panel/usePanelPath'
import { useTableState } from '@/components/tables/useTableState'
import { Button } from '@/components/ui/Button'
import { classNames } from '@/components/ui/classNames'
import { LinkButton } from '@/components/ui/LinkButton'
import type { RankingView } from '@/lib/domain/rankings/rankingView'

const orders = [
  { sort: '', words: 'raw mean' },
  { sort: '-merit', words: 'merit' },
  { sort: '-measure', words: 'own measure' },
  { sort: '-chance', words: 'P above the line' },
] as const

export interface RankingHeadActionsProps {
  view: RankingView
  busy: string | null
  canChange: boolean
  onStart: () => void
  onFreeze: () => void
}

/** The orders to look at, and the next step: begin, freeze, go on to the nights. */
export function RankingHeadActions({ view, busy, canChange, onStart, onFreeze }: RankingHeadActionsProps) {
  const [{ sort }, setState] = useTableState('')
  const panelPath = usePanelPath(view.callSlug)
  return (
    <>
      <span className="flex flex-wrap items-baseline gap-4" role="group" aria-label="Order by">
        <span className="text-muted">Order by</span>
        {orders
          .filter((order) => order.sort !== '-measure' || view.formula.text !== null)
          .map((order) => (
            <button
              key={order.sort}
              type="button"
              aria-pressed={sort === order.sort}
              onClick={() => void setState({ sort: order.sort })}
              className={classNames(
                'max-sm:min-h-11',
                sort === order.sort
                  ? 'border-b-2 border-ink font-semibold'
                  : 'text-accent underline decoration-1 underline-offset-4 hover:decoration-2',
              )}
            >
              {order.words}
            </button>
          ))}
      </span>
      {view.list === null ? (
        <Button
          busy={busy === 'start'}
          busyWord="Beginning"
          offReason={
            view.phase === 'review' || view.phase === 'ranking' ? null : 'after the review has started'
          }
          onClick={onStart}
        >
          Begin the ranking
        </Button>
      ) : (
        <>
          {view.list.frozenAt ? (
            <span className="text-muted">Version {view.list.number}, frozen</span>
          ) : canChange ? (
            <Button look="secondary" busy={busy === 'freeze'} busyWord="Freezing" onClick={onFreeze}>
              Freeze this ranking
            </Button>
          ) : null}
          <LinkButton href={panelPath('nights')}>Go on to nights</LinkButton>
        </>
      )}
    </>
  )
}
