import { VerdictMark } from '@/components/ui/VerdictMark'
import { groupHoursSentence, groupSentence } from '@/lib/domain/observations/rules'
import type { GroupComputation } from '@/lib/domain/observations/types'

/** One group: its name and verdict, what it wants and how its targets stand, and what it adds to the hours. */
export function GroupLine({ group }: { group: GroupComputation }) {
  const { name, rule, size, verdict } = group
  return (
    <div className="min-w-0 text-table [overflow-wrap:anywhere]">
      <p className="m-0 flex flex-wrap items-baseline gap-x-3">
        <strong className="font-semibold">{name}</strong>
        {/* Backups bear on no verdict: theirs would be taken for one that does. */}
        {verdict && rule !== 'backup' ? <VerdictMark verdict={verdict} /> : null}
      </p>
      <p className="m-0">
        {groupSentence(group)}{' '}
        {size > 0 ? <span className="text-muted">{groupHoursSentence(group)}</span> : null}
      </p>
    </div>
  )
}
