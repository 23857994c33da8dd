import {
  countInWords,
  formatHoursFromSeconds,
  formatList,
  formatMoneyShort,
  formatNumber,
} from '@/lib/format'
import { categories } from '../proposals/categories'
import type { ProposalContents } from '../proposals/types'
import type { CarriedNote } from './types'

const hours = (seconds: number | null) => (seconds === null ? 'no limit' : formatHoursFromSeconds(seconds))

function notesOnKind(old: ProposalContents, now: ProposalContents): CarriedNote[] {
  const notes: CarriedNote[] = []
  if (old.kind.kind !== now.kind.kind)
    notes.push({
      section: 'question',
      sentence: `In call ${old.call.number} this was of the kind “${old.kind.title}”; it is “${now.kind.title}” now.`,
      todo: `It may have ${countInWords(now.kind.pageLimit, 'page')} of justification and ask for ${now.kind.maxSeconds === null ? 'any number of hours' : `at most ${hours(now.kind.maxSeconds)}`}.`,
    })
  if (now.kind.needsStudent && !old.kind.needsStudent)
    notes.push({
      section: 'people',
      sentence: `“${now.kind.title}” names a student and a supervisor.`,
      todo: 'Say who they are.',
    })
  const says = [
    now.kind.needsCadence && !old.kind.needsCadence ? 'how often' : '',
    now.kind.needsLastNight && !old.kind.needsLastNight ? 'by when' : '',
  ].filter(Boolean)
  if (says.length > 0)
    notes.push({
      section: 'observing',
      sentence: `“${now.kind.title}” says ${formatList(says)} each target is to be observed.`,
      todo: 'Say it with the conditions.',
    })
  const most = now.kind.targetLimit
  if (most !== null && most !== old.kind.targetLimit)
    notes.push({
      section: 'targets',
      sentence: `“${now.kind.title}” names at most ${countInWords(most, 'target')}.`,
      todo:
        now.targets.length > most
          ? `Take out ${countInWords(now.targets.length - most, 'target')}.`
          : 'Yours fit.',
    })
  return notes
}

function notesOnText(old: ProposalContents, now: ProposalContents): CarriedNote[] {
  const notes: CarriedNote[] = []
  const length = [...now.abstract].length
  const limit = now.kind.abstractLimit
  if (limit !== old.kind.abstractLimit)
    notes.push({
      section: 'question',
      sentence: `An abstract has at most ${formatNumber(limit)} characters in this call; it was ${formatNumber(old.kind.abstractLimit)}.`,
      todo: length > limit ? `Take out ${formatNumber(length - limit)}.` : 'Yours fits.',
    })
  if (now.category === '' && !categories.some((known) => known === old.category) && old.category !== '')
    notes.push({
      section: 'question',
      sentence: `The category “${old.category}” is gone.`,
      todo: 'Choose another.',
    })
  if (now.kind.pageLimit !== old.kind.pageLimit) {
    const paper = now.papers.find(({ kind }) => kind === 'justification')
    const over = (paper?.pages ?? 0) - now.kind.pageLimit
    notes.push({
      section: 'papers',
      sentence: `The justification has at most ${countInWords(now.kind.pageLimit, 'page')} in this call; it was ${old.kind.pageLimit}.`,
      todo: over > 0 ? `Shorten it by ${countInWords(over, 'page')}.` : 'Yours fits.',
    })
  }
  return notes
}

function notesOnTimeAndFee(old: ProposalContents, now: ProposalContents): CarriedNote[] {
  const notes: CarriedNote[] = []
  const asked = now.observations.reduce((sum, { askedSeconds }) => sum + askedSeconds, 0)
  const most = now.kind.maxSeconds
  if (most !== old.kind.maxSeconds)
    notes.push({
      section: 'observing',
      sentence: `This kind of proposal may ask for ${most === null ? 'any number of hours' : `at most ${hours(most)}`}; it was ${hours(old.kind.maxSeconds)}.`,
      todo: most !== null && asked > most ? `Ask for ${hours(asked - most)} less.` : 'Yours fits.',
    })
  const fee = ({ call, kind }: ProposalContents) =>
    call.currency && kind.feeMinor > 0 ? formatMoneyShort(kind.feeMinor, call.currency) : 'nothing'
  if (fee(old) !== fee(now))
    notes.push({
      section: 'send',
      sentence: `Sending costs ${fee(now)} in this call; it was ${fee(old)}.`,
      todo: 'Nothing before you send.',
    })
  return notes
}

/** Kinds, limits and fees that are not what they were. */
export const notesOnRules = (old: ProposalContents, now: ProposalContents): CarriedNote[] => [
  ...notesOnKind(old, now),
  ...notesOnText(old, now),
  ...notesOnTimeAndFee(old, now),
]
