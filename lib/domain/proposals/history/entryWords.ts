import { formatHoursFromSeconds, formatList, formatNumber, formatUtcInstant } from '@/lib/format'
import { field, namesAt, numberAt, textAt, type EntryValues } from './entryValues'
import { groupWords } from './groupWords'
import { questionWords } from './questionWords'
import { targetsWords } from './targetsWords'
import { writingWords } from './writingWords'

/** What rows are called now, by their keys; null for those that are gone. */
export interface RowNames {
  target: (id: number) => string | null
  observation: (id: number) => string | null
}

type Words = (entry: EntryValues, names: RowNames) => string

const quoted = (text: string) =>
  text === '' ? 'an empty one' : `“${text.length > 60 ? `${text.slice(0, 57)}…` : text}”`

const paperNames: Readonly<Record<string, string>> = {
  justification: 'the justification',
  'team-expertise': 'the page on the team',
}

const accessWords: Readonly<Record<string, string>> = {
  read: 'may read it',
  edit: 'may change it',
  deputy: 'may change and send it',
}

const target = (value: unknown) => textAt(value, 'target', 'name') ?? 'a target'

const observed = (value: unknown, names: RowNames) => {
  const name = names.target(numberAt(value, 'observation', 'targetId') ?? 0)
  return name ? `an observation of ${name}` : 'an observation'
}

function askedWords({ before, after }: EntryValues, names: RowNames): string {
  const total = (value: unknown) =>
    (Array.isArray(field(value, 'asked')) ? (field(value, 'asked') as unknown[]) : []).reduce<number>(
      (sum, row) => sum + (numberAt(row, 'askedSeconds') ?? 0),
      0,
    )
  const rows = field(after, 'asked')
  const only =
    Array.isArray(rows) && rows.length === 1 ? names.observation(numberAt(rows[0], 'id') ?? 0) : null
  return `Asked hours${only ? ` for ${only}` : ''}: ${formatHoursFromSeconds(total(before))} to ${formatHoursFromSeconds(total(after))}`
}

function paperWords({ before, after }: EntryValues): string {
  const what = paperNames[textAt(after, 'kind') ?? ''] ?? 'a document'
  const name = textAt(after, 'fileName') ?? 'a file'
  const old = textAt(before, 'fileName')
  return old ? `Papers: ${name} in place of ${old}` : `Papers: ${name} as ${what}`
}

function sectionWords({ before, after }: EntryValues): string {
  const read = (value: unknown): string[] => {
    const text = textAt(value, 'sections_done')
    return text ? (JSON.parse(text) as string[]) : []
  }
  const [was, is] = [read(before), read(after)]
  const added = is.filter((one) => !was.includes(one))
  const taken = was.filter((one) => !is.includes(one))
  return added.length > 0 ? `Marked ${formatList(added)} as done` : `Opened ${formatList(taken)} again`
}

/** The acts an investigator may read about, each in a sentence; what is not listed is not shown. */
export const entryWords: Readonly<Record<string, Words>> = {
  'proposal.begin': ({ after }) => `Began the proposal ${quoted(textAt(after, 'title') ?? '')}`,
  'proposal.continue': ({ before }) =>
    `Carried ${textAt(before, 'reference') ?? 'an earlier proposal'} of call ${numberAt(before, 'call') ?? ''} on`,
  'proposal.question': questionWords,
  'proposal.cosmology': ({ before, after }) => {
    const name = (value: unknown) => {
      const json = textAt(value, 'cosmology_parameters')
      return json ? textAt(JSON.parse(json), 'name') : null
    }
    const chosen = name(after)
    const was = name(before)
    if (chosen && was && chosen !== was) return `Chose ${chosen} in place of ${was}`
    return chosen ? `Changed the parameters of ${chosen}` : 'Chose another cosmology to stand beside'
  },
  'proposal.section': sectionWords,
  'proposal.put-away': () => 'Put the draft away',
  'proposal.take-back': () => 'Took the draft back',
  'proposal.send': () => 'Sent the proposal in',
  'proposal.reopen': () => 'Reopened the proposal; what was sent stands meanwhile',
  'proposal.withdraw': () => 'Withdrew the proposal',
  'proposal.lapse': () => 'The proposal lapsed: its fee was not settled in time',
  'people.add': ({ after }) =>
    `Named ${textAt(after, 'name') ?? 'somebody'}, who ${accessWords[textAt(after, 'access') ?? ''] ?? 'may read it'}`,
  'people.agree': () => 'Agreed to be named',
  'people.remove': ({ before }) => `Took ${textAt(before, 'name') ?? 'somebody'} off`,
  'people.leave': () => 'Left the proposal',
  'people.access': ({ after }) =>
    `${textAt(after, 'name') ?? 'Somebody'} ${accessWords[textAt(after, 'access') ?? ''] ?? 'may read it'} now`,
  'people.describe': ({ after }) => `Changed what is said of ${textAt(after, 'name') ?? 'somebody'}`,
  'people.lead-offer': ({ after }) => `Asked ${textAt(after, 'asked') ?? 'somebody'} to lead the proposal`,
  'people.lead-take-back': ({ before }) =>
    `Took back the request to ${textAt(before, 'asked') ?? 'somebody'} to lead`,
  'people.lead-decline': () => 'Declined to lead the proposal',
  'people.lead-accept': ({ before }) =>
    `Leads the proposal in place of ${textAt(before, 'lead') ?? 'somebody'}`,
  'people.order': () => 'Changed the order of names',
  'writing.save': writingWords,
  'figure.add': ({ after }) => `Added the figure ${textAt(after, 'label') ?? ''}`,
  'figure.replace': ({ after }) => `Put another picture in the figure ${textAt(after, 'label') ?? ''}`,
  'figure.save': ({ after }) => `Changed the words of the figure ${textAt(after, 'label') ?? ''}`,
  'figure.remove': ({ before }) => `Took the figure ${textAt(before, 'label') ?? ''} off`,
  'figure.order': () => 'Changed the order of figures',
  'papers.add': paperWords,
  'papers.repair': paperWords,
  'papers.open-repair': ({ after }) =>
    `Opened ${paperNames[textAt(after, 'kind') ?? ''] ?? 'a document'} for one replacement: ${textAt(after, 'reason') ?? ''}`,
  'papers.close-repair': ({ before }) =>
    `Closed ${paperNames[textAt(before, 'kind') ?? ''] ?? 'a document'} again`,
  'proposal.extend': ({ after }) =>
    `Gave it a deadline of its own, ${formatUtcInstant(new Date(textAt(after, 'closesAt') ?? 0))}: ${textAt(after, 'why') ?? ''}`,
  'papers.remove': ({ before }) => `Papers: took ${textAt(before, 'fileName') ?? 'a file'} off`,
  'target.add': ({ after }) => `Added ${target(after)}`,
  'target.save': ({ before, after }) => {
    const [was, is] = [target(before), target(after)]
    if (was !== is) return `Renamed ${was} to ${is}`
    const [from, to] = [textAt(before, 'target', 'group'), textAt(after, 'target', 'group')]
    if (from === to) return `Changed ${is}`
    return to === null ? `Took ${is} out of ${from}` : `Put ${is} into ${to}`
  },
  'target.change': targetsWords,
  'target.remove': ({ before }) => `Took ${target(before)} off`,
  'target.restore': ({ after }) => `Brought ${target(after)} back`,
  'target.reorder': () => 'Changed the order of targets',
  'target.import': ({ after }) => {
    const names = namesAt(after, 'names')
    return names.length > 4
      ? `Added ${formatNumber(names.length)} targets from a list`
      : `Added ${formatList(names)}`
  },
  'group.save': groupWords,
  'group.remove': ({ before }) => `Took the group ${quoted(textAt(before, 'group', 'name') ?? '')} out`,
  'observation.add': ({ after }, names) => `Added ${observed(after, names)}`,
  'observation.save': ({ before, after }, names) => {
    const asked = (value: unknown) => numberAt(value, 'observation', 'askedSeconds')
    const [was, is] = [asked(before), asked(after)]
    return was !== null && is !== null && was !== is
      ? `Asked hours of ${observed(after, names)}: ${formatHoursFromSeconds(was)} to ${formatHoursFromSeconds(is)}`
      : `Changed ${observed(after, names)}`
  },
  'observation.remove': ({ before }, names) => `Took ${observed(before, names)} off`,
  'observation.ask': askedWords,
  'wish.save': ({ after }) => {
    const nights = textAt(after, 'wish', 'nights')
    return textAt(after, 'wish', 'service') === 'visitor'
      ? `Wished for a visit, nights: ${nights ?? ''}`
      : 'Changed how time on an instrument is wished for'
  },
  'constraints.save': ({ after }) => `Changed the conditions ${quoted(textAt(after, 'set', 'name') ?? '')}`,
  'fee.pay': () => 'The fee was paid',
  'fee.ask-waiver': () => 'Asked for the fee to be waived',
  'fee.decide-waiver': ({ after }) =>
    textAt(after, 'decision') === 'granted' ? 'Waived the fee' : 'Did not waive the fee',
  answerQuestion: () => 'Answered a question about the request',
}
