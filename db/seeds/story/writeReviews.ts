import { finishReview } from '../../../lib/domain/reviews/finishReview.ts'
import { saveReviewText } from '../../../lib/domain/reviews/saveReviewText.ts'
import { saveScore } from '../../../lib/domain/reviews/saveScore.ts'
import { panel } from '../peopleData.ts'
import type { Dice } from './random.ts'
import type { ReviewOptions } from './reviewCall.ts'
import type { Teller } from './teller.ts'

/** Reviewers of a panel score and write, each with a leniency of their own; some reviews may be left to do. */
export async function writeReviews(
  story: Teller,
  chance: Dice,
  call: { id: number; panelId: number },
  options: Pick<ReviewOptions, 'finished' | 'proposals'>,
): Promise<void> {
  const names = new Map(
    (await story.db('people').select('id', 'name')).map((person) => [person.id, person.name] as const),
  )
  const leniency = new Map(panel.map((member) => [member.name, chance.normal(0, 0.6)] as const))
  const criteria = await story.db('call_criteria').where({ call_id: call.id }).orderBy('position')
  const assignments = await story
    .db('assignments as a')
    .join('proposals as p', 'p.id', 'a.proposal_id')
    .where('a.panel_id', call.panelId)
    .whereNull('a.withdrawn_at')
    .orderBy('a.id')
    .select('a.id', 'a.person_id', 'a.version', 'p.title')
  const own = new Map<number, number>()
  for (const assignment of assignments) {
    const name = names.get(assignment.person_id) ?? ''
    const done = own.get(assignment.person_id) ?? 0
    own.set(assignment.person_id, done + 1)
    // The reviewer of the demonstration has scored three and has the rest before her.
    const isLeft =
      options.finished < 1 && (name === 'Delphine Ostrake' ? done >= 3 : chance.next() > options.finished)
    if (isLeft) continue
    const merit = (options.proposals.get(assignment.title)?.merit ?? 6.5) + (leniency.get(name) ?? 0)
    const reviewer = await story.as(name)
    for (const criterion of criteria) {
      const score = Math.min(10, Math.max(0.5, chance.normal(merit, 0.8)))
      await saveScore(reviewer, {
        assignmentId: assignment.id,
        criterionId: criterion.id,
        halfPoints: Math.round(score * 2),
      })
    }
    await saveReviewText(reviewer, {
      assignmentId: assignment.id,
      audience: 'investigators',
      body: chance.pick(comments),
      version: 0,
    })
    await saveReviewText(reviewer, {
      assignmentId: assignment.id,
      audience: 'panel',
      body: chance.pick(notes),
      version: 0,
    })
    await finishReview(reviewer, { assignmentId: assignment.id, version: assignment.version })
  }
}

const comments = [
  'A well-bounded request: the sample is small but each object answers the question by itself. Say how the errors enter the result.',
  'The question is worth the time, and the hours follow from the depth. We would have liked to read what happens if only half of the targets are observed.',
  'The method is sound. The text leaves open how the comparison sample was chosen, and a reader has to guess at the selection.',
  'Ambitious, and honest about its limits. A table of the expected uncertainties for each target would have made the case stronger.',
  'The measurement is clear, but its step from the line width to the conclusion rests on one relation that is known to scatter.',
]
const notes = [
  'Hours look honest. I ran them again under the local ladder: they would still be enough.',
  'Solid, not urgent. I would take half of it.',
  'One of the better ones on my pile.',
  'The sample could be cut by a third without loss.',
]
