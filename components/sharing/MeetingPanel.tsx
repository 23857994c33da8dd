'use client'

import { useDeed } from '@/components/panel/useDeed'
import { Button } from '@/components/ui/Button'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { SharedRow, SharingView } from '@/lib/domain/sharing/sharingView'
import { formatUtc } from '@/lib/format'
import { MergeMoveForm } from './MergeMoveForm'
import type { MeetingOfPanels } from './sharingActions'

export interface MeetingPanelProps {
  view: SharingView
  /** Null for the office, which reads. */
  actions: MeetingOfPanels | null
  chosen: SharedRow | null
}

function stateOf({ list }: SharingView): string {
  if (list === null)
    return 'The order is that of the rule, and the nights follow it. Where proposals near the lines should stand otherwise, chairs and deputies bring the lists together and order them, each move with its reason.'
  if (list.isStale)
    return 'A panel has changed its list since this order was made: it no longer holds. Bring the lists together anew.'
  return list.frozenAt
    ? `Version ${list.number}, frozen ${formatUtc(new Date(list.frozenAt))}: the nights follow it. A later move makes a new version beside it.`
    : `Version ${list.number}, being ordered. The nights follow it once it is frozen; until then they follow the one frozen before, or the rule.`
}

/** The meeting of the panels: bringing the lists together, moving near the lines, freezing the order. */
export function MeetingPanel({ view, actions, chosen }: MeetingPanelProps) {
  const { busy, deed } = useDeed()
  const { list, callId } = view
  const key = { callId, listId: list?.id ?? 0, version: list?.version ?? 0 }
  const isOver = view.phase === 'decided' || view.phase === 'archived'
  const canAct = actions !== null && !isOver && view.whyNotTogether === null
  return (
    <section>
      <SectionHeading dense title="The meeting of the panels" />
      <p className="mt-2 mb-0 text-table">{stateOf(view)}</p>
      {canAct && (list === null || list.isStale) ? (
        <div className="mt-3">
          <Button
            look="secondary"
            size="small"
            busy={busy === 'together'}
            busyWord="Bringing together"
            onClick={() => deed('together', () => actions.together({ callId }))}
          >
            {list === null ? 'Bring the lists together' : 'Bring them together anew'}
          </Button>
        </div>
      ) : null}
      {canAct && list && !list.isStale ? (
        <div className="mt-3 flex flex-col gap-4">
          {chosen?.isNear ? (
            <MergeMoveForm
              key={`${chosen.proposalId}-${list.id}-${list.version}`}
              row={chosen}
              listKey={key}
              action={actions.move}
            />
          ) : (
            <p className="m-0 text-table text-muted">
              {chosen
                ? `${chosen.reviewNumber} does not stand near a line: its panel’s share decides.`
                : 'Choose a proposal near the lines by its number to move it. The order within a panel stands.'}
            </p>
          )}
          {list.frozenAt === null ? (
            <div>
              <Button
                size="small"
                busy={busy === 'freeze'}
                busyWord="Freezing"
                onClick={() => deed('freeze', () => actions.freeze(key))}
              >
                Freeze this order
              </Button>
            </div>
          ) : null}
        </div>
      ) : null}
    </section>
  )
}
