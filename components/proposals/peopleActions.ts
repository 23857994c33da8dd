import type { ActionResult } from '@/lib/actions/result'

type Act<Input> = (input: Input) => Promise<ActionResult<unknown>>
type Access = 'read' | 'edit' | 'deputy'

/** What can be done to the names, as the page's actions. */
export interface PeopleActions {
  remove: Act<{ reference: string; id: number }>
  setAccess: Act<{ reference: string; id: number; access: Access }>
  describe: Act<{
    reference: string
    id: number
    version: number
    institute: string
    orcid: string
    isStudent: boolean
    isSupervisor: boolean
  }>
  move: Act<{ reference: string; id: number; by: -1 | 1 }>
}
