import { formatList } from '@/lib/format'

interface MergePerson {
  id: number
  name: string
  email: string
  institute: string
}

/** Two accounts side by side, with what would move and what stands in the way. */
export interface MergeView {
  keep: MergePerson
  /** Null where no account has the address given. */
  gone: MergePerson | null
  inTheWay: string[]
  moves: { what: string; rows: number }[]
}

const words: Readonly<Record<string, string>> = {
  'proposal_people.person_id': 'Places on proposals',
  'proposal_version_people.person_id': 'Names on sent versions',
  'programmes.lead_person_id': 'Programmes led',
  'assignments.person_id': 'Reviews',
  'panel_members.person_id': 'Seats on panels',
  'role_grants.person_id': 'Roles',
  'conflicts.person_id': 'Interests',
  'interest_declarations.person_id': 'Declarations of interest',
  'expertise.person_id': 'What they say they know',
  'assessments.assessed_by': 'Assessments',
  'outbox.person_id': 'Letters',
  'waivers.asked_by': 'Waivers asked for',
  'demographics.person_id': 'Answers given freely',
}

const others = 'Marks of who did it: began, uploaded, sent, paid, decided'

/** What moves, by kind, the marks of deeds together at the end. */
export function moveWords(
  counted: readonly { table: string; column: string; rows: number }[],
): MergeView['moves'] {
  const sums = new Map<string, number>()
  for (const { table, column, rows } of counted) {
    const what = words[`${table}.${column}`] ?? others
    sums.set(what, (sums.get(what) ?? 0) + rows)
  }
  return [...Object.values(words), others].flatMap((what) => {
    const rows = sums.get(what)
    return rows ? [{ what, rows }] : []
  })
}

/** Why two accounts cannot be one, a sentence each. */
export function clashWords(clashes: {
  bothNamed: readonly string[]
  reviewsOther: readonly string[]
  bothReview: readonly string[]
  panels: readonly string[]
}): string[] {
  const { bothNamed, reviewsOther, bothReview, panels } = clashes
  return [
    bothNamed.length > 0 && `Both are named on ${formatList(bothNamed)}. One of the names has to go first.`,
    reviewsOther.length > 0 &&
      `One reviews what the other asks for or may not judge: ${formatList(reviewsOther)}. The chair has to give the review to somebody else first.`,
    bothReview.length > 0 &&
      `Both were given ${formatList(bothReview)} to review. Two reviews cannot become one.`,
    panels.length > 0 && `Both have a seat on ${formatList(panels)}. Two members cannot become one.`,
  ].filter((sentence) => sentence !== false)
}
