import type { NightsView } from '@/lib/domain/decisions/readNights'
import { AwardForm } from './AwardForm'
import { FacingRow } from './FacingRow'
import type { SaveAwardAction } from './nightsActions'

export interface FacingTableProps {
  view: NightsView
  openId: number | null
  /** Null where nothing can be given any more. */
  onOpen: ((proposalId: number | null) => void) | null
  save: SaveAwardAction
  onSaved: () => void
}

/** Hours suggested and hours given, facing each other in the order of the ranking. */
export function FacingTable({ view, openId, onOpen, save, onSaved }: FacingTableProps) {
  const most = Math.max(
    1,
    ...view.rows.flatMap((row) => row.lines.map((line) => Math.max(line.askedSeconds, line.wholeSeconds))),
  )
  const first = view.telescopes[0]?.id
  return (
    <section aria-label="Hours suggested and hours given" className="mt-4">
      <div className="grid grid-cols-[minmax(0,1fr)_auto_minmax(0,1fr)] gap-x-6 py-2 text-caption font-semibold rule-open max-sm:hidden">
        <span>Suggested, or why not</span>
        <span>Rank, review number</span>
        <span className="text-right">Given</span>
      </div>
      <ol className="plain-list">
        {view.rows.map((row) => (
          <li
            key={row.proposalId}
            className={
              row.rank === view.line ? 'border-b-2 border-dashed border-lamp' : 'border-b border-rule'
            }
          >
            <FacingRow
              row={row}
              mostHours={most / 3600}
              firstTelescope={first}
              isOpen={openId === row.proposalId}
              onOpen={onOpen ? () => onOpen(openId === row.proposalId ? null : row.proposalId) : null}
            />
            {openId === row.proposalId ? (
              <AwardForm
                key={row.decisionVersion}
                row={row}
                view={view}
                save={save}
                onSaved={onSaved}
                onLeave={() => onOpen?.(null)}
              />
            ) : null}
          </li>
        ))}
      </ol>
      <p className="mt-3 flex flex-wrap gap-x-6 gap-y-1 text-caption text-muted">
        {view.telescopes.map((telescope) => (
          <span key={telescope.id} className="inline-flex items-center gap-2">
            <svg width="20" height="12" aria-hidden="true" focusable="false">
              <rect width="20" height="12" fill={telescope.id === first ? 'var(--s1)' : 'var(--s3)'} />
            </svg>
            {telescope.name}
          </span>
        ))}
        <span>outline: asked; tick: least useful award; dashed: the line</span>
      </p>
    </section>
  )
}
