import { createContext } from 'react'
import type { ActionResult } from '@/lib/actions/result'
import type { OfficePersonRow, OpenInvitationRow } from '@/lib/domain/people/officeSchema'

export type OfficeStep = (deed: () => Promise<ActionResult<unknown>>, done: string) => Promise<void>

/** What rows of the people tables can ask for; their columns stand at module scope and reach it by context. */
export const OfficeSteps = createContext<{
  ownId: number
  toggle: (person: OfficePersonRow) => Promise<void>
  takeBack: (line: OpenInvitationRow) => Promise<void>
} | null>(null)
