import { standingReaders } from '@/db/queries/standingReaders'
import { paths } from '@/lib/paths'
import type { Context } from '../context'
import { paperReplaced } from '../outbox/letters/paperReplaced'
import { paperReplacedForReader } from '../outbox/letters/paperReplacedForReader'
import { queueLetter } from '../outbox/queueLetter'
import type { ProposalContents } from '../proposals/types'
import type { Paper } from '../proposals/writingTypes'
import type { Submission } from '../submission/freezeVersion'

/** Confirms the new version to everyone named on it, and tells its reviewers, by review number, to read again. */
export async function tellOfReplacement(
  tx: Context,
  told: { contents: ProposalContents; submission: Submission; kind: Paper['kind']; fileName: string },
): Promise<void> {
  const { contents, submission, kind, fileName } = told
  const { origin } = tx.request
  const cause = `sent:${contents.id}:${submission.versionNumber}`
  const url = origin + paths.proposalSent(contents.reference)
  for (const person of contents.people)
    await queueLetter(tx, person, paperReplaced({ name: person.name, fileName, ...submission }, url), cause)
  // Only the justification is in the packet.
  if (kind !== 'justification' || !contents.reviewNumber) return
  const { reviewNumber } = contents
  for (const { assignmentId, ...person } of await standingReaders(tx.db, contents.id)) {
    const letter = paperReplacedForReader(
      { name: person.name, reviewNumber },
      origin + paths.review(assignmentId),
    )
    await queueLetter(tx, person, letter, `replaced:${contents.id}:${submission.versionNumber}`)
  }
}
