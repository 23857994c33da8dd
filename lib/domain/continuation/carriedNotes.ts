import type { ProposalContents } from '../proposals/types'
import { notesOnModes } from './notesOnModes'
import { notesOnRules } from './notesOnRules'
import { notesOnWriting } from './notesOnWriting'
import type { CarriedNote } from './types'

/** Papers that came along, or did not, and people who are asked anew. */
function notesOnPapersAndPeople(old: ProposalContents, now: ProposalContents): CarriedNote[] {
  const notes: CarriedNote[] = []
  const from = `call ${old.call.number}`
  for (const paper of old.papers) {
    const what = paper.kind === 'justification' ? 'The justification' : 'The page on the team'
    const copy = now.papers.find(({ kind }) => kind === paper.kind)
    if (!copy)
      notes.push({
        section: 'papers',
        sentence: `${what} of ${from} is not here.`,
        todo: 'Add it anew.',
      })
    else if (copy.sha256 === paper.sha256)
      notes.push({
        section: 'papers',
        sentence: `${what} is the one of ${from}.`,
        todo: 'Read it through: season, hours and results may have moved on since.',
      })
  }
  const waiting = now.people.filter(
    ({ email, confirmedAt }) =>
      confirmedAt === null && old.people.some((one) => one.email === email && one.confirmedAt),
  )
  if (waiting.length > 0)
    notes.push({
      section: 'people',
      sentence: `Asked to agree anew: ${waiting.map(({ name }) => name).join(', ')}.`,
      todo: 'Who has not agreed is left out when it is sent.',
    })
  return notes
}

/**
 * What differs between an earlier proposal and the call it is carried on in, each at its section with what to do. A
 * note goes when its cause is mended, and all of a section's go when the author calls that section done.
 */
export function carriedNotes(old: ProposalContents, now: ProposalContents): CarriedNote[] {
  return [
    ...notesOnRules(old, now),
    ...notesOnModes(old, now),
    ...notesOnPapersAndPeople(old, now),
    ...notesOnWriting(old, now),
  ].filter(({ section }) => !now.sectionsDone.includes(section))
}
