'use client'

import { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { showToast } from '@/components/ui/showToast'
import { formatUtc } from '@/lib/format'
import { browserName } from './browserName'

interface SessionListProps {
  sessions: readonly { createdAt: string; lastSeenAt: string; userAgent: string; isThis: boolean }[]
  action: FormAction<Record<string, never>, { ended: number }>
}

const nothing = z.object({})

/** Browsers signed in with this account, and one button that ends all the others. */
export function SessionList({ sessions, action }: SessionListProps) {
  const form = useActionForm({
    schema: nothing,
    action,
    defaultValues: {},
    onDone: ({ ended }) => showToast(ended === 1 ? 'One browser signed out' : `${ended} browsers signed out`),
  })
  const others = sessions.filter((line) => !line.isThis).length
  return (
    <section>
      <SectionHeading title="Signed in" dense />
      <ul className="plain-list mb-4">
        {sessions.map((line) => (
          <li key={line.createdAt + line.userAgent} className="border-b border-rule py-2.5 text-table">
            <span className="font-semibold">{browserName(line.userAgent)}</span>
            {line.isThis ? ', this one' : ''}
            <span className="block text-muted">
              since {formatUtc(new Date(line.createdAt))}, last used {formatUtc(new Date(line.lastSeenAt))}
            </span>
          </li>
        ))}
      </ul>
      {others > 0 ? (
        <ActionForm form={form}>
          <SubmitButton look="secondary" size="small" busyWord="Signing out">
            Sign out all others
          </SubmitButton>
        </ActionForm>
      ) : null}
    </section>
  )
}
