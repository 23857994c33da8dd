import type { z } from 'zod'
import type { investigatorDetailsSchema } from './peopleSchema'
import type { Investigator } from './types'

/** What is said of someone named, as its form holds it. */
export function descriptionFormOf({
  institute,
  orcid,
  isStudent,
  isSupervisor,
}: Pick<Investigator, 'institute' | 'orcid' | 'isStudent' | 'isSupervisor'>): z.input<
  typeof investigatorDetailsSchema
> {
  return { institute, orcid: orcid ?? '', isStudent, isSupervisor }
}
