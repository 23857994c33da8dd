import { assessRequest } from '../../../lib/domain/assessments/assessRequest.ts'
import { assignReviewers } from '../../../lib/domain/assignments/assignReviewers.ts'
import { startReview } from '../../../lib/domain/assignments/startReview.ts'
import { suggestForPanel } from '../../../lib/domain/assignments/suggestForPanel.ts'
import { declareInterests } from '../../../lib/domain/conflicts/declareInterests.ts'
import { saveFormula } from '../../../lib/domain/rankings/saveFormula.ts'
import type { SeededCall } from '../calls.ts'
import { expertiseSchema } from '../../../lib/domain/expertise/schema.ts'
import { categoryKey } from '../../../lib/domain/expertise/levelWords.ts'
import { saveExpertise } from '../../../lib/domain/expertise/saveExpertise.ts'
import { expertise } from '../expertiseData.ts'
import { panel } from '../peopleData.ts'
import type { SeedProposal } from './proposalData.ts'
import type { Dice } from './random.ts'
import type { Teller } from './teller.ts'
import { writeReviews } from './writeReviews.ts'

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
  await writeReviews(story, chance, call, options)
}
