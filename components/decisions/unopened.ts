import type { DecisionRow } from '@/lib/domain/decisions/decisionsView'

/** Decisions their reader may stand behind and has not yet. */
export const mayApprove = (row: DecisionRow) => row.whyNotApproved === null && row.approval !== 'approved'

export const needsOpening = (row: DecisionRow) => mayApprove(row) && !row.isOpened

export const decisionButtonId = (proposalId: number) => `decision-${proposalId}`

/** A way to the next decision not opened beside this one; null where none is left. */
export function nextToOpen(
  rows: readonly DecisionRow[],
  current: number,
  show: (proposalId: number) => void,
): (() => void) | null {
  const place = rows.findIndex(({ proposalId }) => proposalId === current)
  const next = [...rows.slice(place + 1), ...rows.slice(0, Math.max(0, place))].find(needsOpening)
  return next ? () => show(next.proposalId) : null
}
