import type { Change } from '@/lib/domain/proposals/history/changesOf'
import { changeTime } from './changeTime'

/** Changes, newest first: when, who, what. */
export function ChangeList({ changes, now }: { changes: readonly Change[]; now: Date }) {
  return (
    <ol className="plain-list text-table">
      {changes.map((change, index) => (
        <li
          key={`${change.at}-${index}`}
          className="grid grid-cols-[7rem_minmax(0,1fr)] gap-x-2 border-t border-rule py-2"
        >
          <time dateTime={change.at} className="text-muted">
            {changeTime(new Date(change.at), now)}
          </time>
          <div>
            <strong className="font-semibold">{change.who}</strong>
            <br />
            <span className="[overflow-wrap:anywhere]">{change.words}</span>
          </div>
        </li>
      ))}
    </ol>
  )
}
