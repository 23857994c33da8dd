import type { Role } from '../actor'

/** Roles as they are called on screen and in letters. */
export const roleWords: Readonly<Record<Role, string>> = {
  investigator: 'investigator',
  reviewer: 'reviewer',
  chair: 'chair',
  'instrument-scientist': 'instrument scientist',
  office: 'time-allocation office',
}
