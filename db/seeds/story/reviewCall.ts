import { assessRequest } from '../../../lib/domain/assessments/assessRequest.ts'
import { assignReviewers } from '../../../lib/domain/assignments/assignReviewers.ts'
import { startReview } from '../../../lib/domain/assignments/startReview.ts'
import { suggestForPanel } from '../../../lib/domain/assignments/suggestForPanel.ts'
import { declareInterests } from '../../../lib/domain/conflicts/declareInterests.ts'
import { saveFormula } from '../../../lib/domain/rankings/saveFormula.ts'
import { finishReview } from '../../../lib/domain/reviews/finishReview.ts'
import { saveReviewText } from '../../../lib/domain/reviews/saveReviewText.ts'
import { saveScore } from '../../../lib/domain/reviews/saveScore.ts'
import type { SeededCall } from '../calls.ts'
import { expertiseSchema } from '../../../lib/domain/expertise/schema.ts'
import { categoryKey } from '../../../lib/domain/expertise/levels.ts'
import { saveExpertise } from '../../../lib/domain/expertise/saveExpertise.ts'
import { expertise } from '../expertiseData.ts'
import { panel } from '../peopleData.ts'
import type { SeedProposal } from './proposalData.ts'
import type { Dice } from './random.ts'
import type { Teller } from './teller.ts'

const day = 86_400_000
const later = (from: Date, days: number) => new Date(from.getTime() + days * day)

const scientistOf: Record<string, string> = {
  ember: 'Signe Oskeldane',
  spindle: 'Signe Oskeldane',
  lantern: 'Piers Haldrick',
  wick: 'Noor Velasquine',
}

/** Instrument scientists answer the requests: most are accepted, some changed, one is not possible. */
export async function assessCall(
  story: Teller,
  chance: Dice,
  call: SeededCall,
  share: number,
): Promise<void> {
  const requests = await story
    .db('assessment_requests as r')
    .join('proposals as p', 'p.id', 'r.proposal_id')
    .join('instruments as i', 'i.id', 'r.instrument_id')
    .where('p.call_id', call.id)
    .orderBy('r.id')
    .select('r.id', 'i.slug', 'p.id as proposalId')
  for (const [index, request] of requests.entries()) {
    if (chance.next() > share) continue
    const [row] = await story
      .db('observations')
      .where({ proposal_id: request.proposalId })
      .sum({ asked: 'asked_seconds' })
    const asked = Number((row as { asked: string | null } | undefined)?.asked ?? 0)
    const verdict = index === 16 ? 'not-possible' : index % 7 === 3 ? 'change' : 'accepted'
    const factor = verdict === 'change' ? 1.1 : chance.between(0.95, 1)
    await assessRequest(await story.as(scientistOf[request.slug] ?? 'Signe Oskeldane'), {
      requestId: request.id,
      over: null,
      verdict,
      trueHours: Math.round(asked * factor),
      reason:
        verdict === 'accepted'
          ? 'The hours agree with our own spectra of last season.'
          : verdict === 'change'
            ? 'Telluric standards take a tenth more than the engine counts.'
            : 'The guide field holds no star bright enough at this position.',
      panelNote: 'Straightforward for the instrument.',
    } as never)
  }
}

export interface ReviewOptions {
  readers: number
  /** Share of reviews that are finished. */
  finished: number
  proposals: Map<string, SeedProposal>
}

/** Members of the panel say what they know, once for all calls. */
async function sayWhatIsKnown(story: Teller): Promise<void> {
  if (await story.db('expertise').first()) return
  for (const [name, { levels, words }] of Object.entries(expertise)) {
    const chosen = Object.entries(levels).map(([category, level]) => [categoryKey(category), String(level)])
    const input = expertiseSchema.parse({ levels: Object.fromEntries(chosen), words: words.join(', ') })
    await saveExpertise(await story.as(name), input)
  }
}

/** The chair starts the review and assigns; reviewers declare, score and write. */
export async function reviewCall(
  story: Teller,
  chance: Dice,
  call: SeededCall,
  options: ReviewOptions,
): Promise<void> {
  await story.at(later(call.dates.closes_at, 3))
  const chair = await story.as('Edda Vorskell')
  const { slug } = await story
    .db('calls')
    .where({ id: call.id })
    .first('slug')
    .then((row) => row ?? { slug: '' })
  await saveFormula(chair, { panelId: call.panelId, formula: 'mean - 0.2 * spread' })
  await startReview(chair, { callId: call.id })
  await sayWhatIsKnown(story)
  for (const member of panel.slice(1))
    await declareInterests(await story.as(member.name), { callSlug: slug, names: [], wentThrough: true })
  // Dealt out without the solver: the marks below are drawn in the order of these pairs.
  const { pairs } = await suggestForPanel(chair, { panelId: call.panelId, each: options.readers }, null)
  await assignReviewers(chair, { panelId: call.panelId, pairs })
  await story.at(later(call.dates.closes_at, 15))
  await assessCall(story, chance, call, options.finished < 1 ? 0.8 : 1)

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
