import { formatCalendarDate, formatList } from '@/lib/format'
import { modeFields, modeTyped } from '../facility/modeForm'
import type { ModeRecord } from '../facility/types'
import type { ProposalContents } from '../proposals/types'
import { datesIn } from './carryContents'
import type { CarriedNote } from './types'

/** The fields of a mode's record that differ, by their names on screen in small letters. */
function changedIn(old: ModeRecord, now: ModeRecord): string[] {
  const [a, b] = [modeTyped(old), modeTyped(now)]
  return (Object.keys(modeFields) as (keyof typeof modeFields)[])
    .filter((name) => JSON.stringify(a[name]) !== JSON.stringify(b[name]))
    .map((name) => modeFields[name].label.toLowerCase())
}

const recompute = 'Hours needed are computed anew from it. Hold the hours asked against them.'

function noteOnMode(was: ModeRecord, is: ModeRecord | undefined, targets: string[]): CarriedNote | null {
  if (!is)
    return {
      section: 'observing',
      sentence: `${was.name} is not on offer in this call; it was to observe ${formatList(targets.slice(0, 4))}${targets.length > 4 ? ' and others' : ''}.`,
      todo: 'Choose another mode for these observations, or take them out.',
    }
  if (is.recordVersion === was.recordVersion) return null
  const fields = changedIn(was, is)
  const which = fields.length > 0 ? ` (${formatList(fields)})` : ''
  return {
    section: 'observing',
    sentence: `The record of ${is.name} has changed from version ${was.recordVersion} to ${is.recordVersion}${which}.`,
    todo: recompute,
  }
}

function notesOnPlaces(old: ProposalContents, now: ProposalContents, used: ModeRecord[]): CarriedNote[] {
  const notes: CarriedNote[] = []
  if (old.site.siteId === now.site.siteId && old.site.recordVersion !== now.site.recordVersion)
    notes.push({
      section: 'observing',
      sentence: `The record of ${now.site.name} has changed from version ${old.site.recordVersion} to ${now.site.recordVersion}.`,
      todo: recompute,
    })
  const telescopes = new Map(used.map(({ telescope }) => [telescope.id, telescope]))
  for (const was of telescopes.values()) {
    const is = now.modes.find(({ telescope }) => telescope.id === was.id)?.telescope
    if (is && is.recordVersion !== was.recordVersion)
      notes.push({
        section: 'observing',
        sentence: `The record of the ${is.name} has changed from version ${was.recordVersion} to ${is.recordVersion}.`,
        todo: recompute,
      })
  }
  return notes
}

function notesOnDates(old: ProposalContents, now: ProposalContents): CarriedNote[] {
  return old.constraintSets.flatMap((set): CarriedNote[] => {
    const [from, to] = [set.dateFrom, set.dateTo]
    const kept = datesIn(set, now.call)
    const standing = now.constraintSets.find(({ name }) => name === set.name)
    if ((kept.dateFrom === from && kept.dateTo === to) || !standing || standing.dateFrom || standing.dateTo)
      return []
    const span = [from && `from ${formatCalendarDate(from)}`, to && `to ${formatCalendarDate(to)}`]
      .filter(Boolean)
      .join(' ')
    return [
      {
        section: 'observing',
        sentence: `The conditions “${set.name}” held ${span}, outside this season. The dates are taken out.`,
        todo: 'Give new dates, where they matter.',
      },
    ]
  })
}

/**
 * What the facility offers otherwise than it did: modes of the earlier proposal that are gone while an observation
 * still asks for them, records that changed, dates that lie in another season.
 */
export function notesOnModes(old: ProposalContents, now: ProposalContents): CarriedNote[] {
  const asked = new Set(now.observations.map(({ modeId }) => modeId))
  const used = old.modes.filter(({ modeId }) => asked.has(modeId))
  const notes = used.flatMap((was) => {
    const targets = now.observations
      .filter(({ modeId }) => modeId === was.modeId)
      .map(({ targetId }) => now.targets.find(({ id }) => id === targetId)?.name ?? 'a target')
    const is = now.modes.find(({ modeId }) => modeId === was.modeId)
    return noteOnMode(was, is, [...new Set(targets)]) ?? []
  })
  return [...notes, ...notesOnPlaces(old, now, used), ...notesOnDates(old, now)]
}
