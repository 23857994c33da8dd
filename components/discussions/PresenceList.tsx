'use client'

import { useDeed } from '@/components/panel/useDeed'
import type { TableView } from '@/lib/domain/discussions/tableView'
import type { PresenceAction } from './meetingActions'

/** Members of the panel with a box each: ticked while they are at the meeting. */
export function PresenceList({ view, presence }: { view: TableView; presence: PresenceAction }) {
  const { busy, deed } = useDeed()
  return (
    <ul className="plain-list mt-3 grid gap-x-8 gap-y-1 text-table sm:grid-cols-2 lg:grid-cols-4">
      {view.members.map((member) => {
        const name = `presence-${member.personId}`
        return (
          <li key={member.personId}>
            <label className="flex items-center gap-3 py-1 max-sm:min-h-11">
              <input
                type="checkbox"
                className="size-5 shrink-0 accent-accent"
                checked={busy === name ? !member.isPresent : member.isPresent}
                onChange={(event) => {
                  const isPresent = event.currentTarget.checked
                  deed(name, () => presence({ panelId: view.panelId, personId: member.personId, isPresent }))
                }}
              />
              <span>
                {member.name} <span className="text-muted">{member.number}</span>
              </span>
            </label>
          </li>
        )
      })}
    </ul>
  )
}
