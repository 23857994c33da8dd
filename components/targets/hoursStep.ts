import type { ProposalContents } from '@/lib/domain/proposals/types'
import { formatHoursFromSeconds, formatList } from '@/lib/format'
import type { HoursStep, Versioned } from './undoSteps'

/** Taking back hours that were just asked, of observations as they were before. */
export function hoursStep(
  { observations, targets }: Pick<ProposalContents, 'observations' | 'targets'>,
  saved: readonly Versioned[],
): HoursStep {
  const before = saved.flatMap(({ id, version }) => {
    const was = observations.find((one) => one.id === id)
    return was ? [{ id, version, was }] : []
  })
  const said = before.map(({ was }) => {
    const name = targets.find(({ id }) => id === was.targetId)?.name ?? 'a target'
    return `${name}, ${formatHoursFromSeconds(was.askedSeconds)} again`
  })
  return {
    kind: 'hours',
    words: `hours asked for ${formatList(said)}`,
    // Not rounded as a cell shows them: seconds come back as they were.
    asked: before.map(({ id, version, was }) => ({ id, version, hours: String(was.askedSeconds / 3600) })),
  }
}
