import { formatHoursFromSeconds, formatList, formatNights, formatNumber } from '@/lib/format'
import type { ProposalSection } from '@/lib/paths'
import { findPreset } from '@/lib/science/cosmology'
import { awaitedWords } from '../observations/awaitedWords'
import { groupHoursSentence, groupSentence } from '../observations/groupWords'
import { needOf } from '../observations/needOf'
import type { ProposalComputation } from '../observations/types'
import { leftOut, namedOnSending } from '../proposals/namedOnSending'
import type { ProposalContents } from '../proposals/types'
import { wishLines, type WishLine } from '../wishes/wishLines'
import { leftOutWords } from './leftOutWords'

export interface ReadThroughRow {
  label: string
  text: string
  /** Where it is changed. */
  section: ProposalSection
}

export interface ReadThroughGroup {
  question: string
  rows: ReadThroughRow[]
}

const unsaid = 'Nothing yet'
const opening = 120

/** The first words of a long text, cut at a word. */
function firstWords(text: string): string {
  if (text.length <= opening) return `“${text}”`
  return `“${text.slice(0, text.lastIndexOf(' ', opening))} …”`
}

function abstractWords({ abstract }: ProposalContents): string {
  if (!abstract) return unsaid
  return `${formatNumber([...abstract].length)} characters. ${firstWords(abstract)}`
}

function targetWords({ targets, groups }: ProposalContents): string {
  if (targets.length === 0) return unsaid
  const required = targets.filter((target) => needOf(target, groups) === 'required').length
  const redshifts = targets.flatMap(({ redshift }) => (redshift === null ? [] : [redshift]))
  const span = [Math.min(...redshifts), Math.max(...redshifts)].map((z) => formatNumber(z, 3))
  const parts = [targets.length === 1 ? '1 target' : `${targets.length} targets`]
  if (required > 0) parts.push(`${required} required`)
  if (redshifts.length > 0) parts.push(`z = ${[...new Set(span)].join(' to ')}`)
  return parts.join(', ')
}

function cosmologyWords({ cosmology }: ProposalContents): string {
  const own = cosmology.parameters
  if (!cosmology.comparisonId) return own.name
  const beside = findPreset(cosmology.comparisonId).parameters
  return `${own.name}; beside it ${beside.name}, H₀ ${formatNumber(beside.H0, 2)}, Ωₘ ${formatNumber(beside.Om0, 2)}`
}

const moons = { dark: 'dark time', grey: 'grey or darker', any: 'any Moon' } as const

function observingWords({ observations, modes, constraintSets }: ProposalContents): string {
  if (observations.length === 0) return unsaid
  const used = modes.filter(({ modeId }) => observations.some((observation) => observation.modeId === modeId))
  const sets = constraintSets.filter(({ id }) => observations.some((o) => o.constraintSetId === id))
  const instruments = [
    ...new Set(
      used.map(
        (mode) =>
          `${mode.telescope.name} ${formatNumber(mode.telescope.apertureM, 1)} m, ${mode.instrument.name}`,
      ),
    ),
  ]
  const snr = [...new Set(observations.map(({ wantedSnr }) => formatNumber(wantedSnr)))]
  const skies = [
    ...new Set(
      sets.map((set) => `${moons[set.moon]}; ${formatNumber(set.imageQualityArcsec, 1)}″ or better`),
    ),
  ]
  return [...instruments, `S/N ${formatList(snr)}`, ...skies].join('; ')
}

const wishWords = ({ visit, least }: WishLine) =>
  `${visit ? `a visit of ${visit}` : 'in the queue'}${least ? `; of use from ${least}` : ''}`

/** Everything a proposal says, in the order its questions are asked, each row with the page that changes it. */
export function readThrough(
  contents: ProposalContents,
  computation: ProposalComputation,
  papers: { justification: string; recognised: string },
): ReadThroughGroup[] {
  const leads = contents.people.filter(({ role }) => role === 'pi').map(({ name }) => name)
  const others = namedOnSending(contents.people)
    .filter(({ role }) => role !== 'pi')
    .map(({ name }) => name)
  const without = leftOut(contents.people).map(({ name }) => name)
  const asked = formatHoursFromSeconds(computation.askedSeconds)
  const needed = formatHoursFromSeconds(computation.neededSeconds)
  const row = (label: string, section: ProposalSection, text: string): ReadThroughRow => ({
    label,
    section,
    text,
  })
  return [
    {
      question: 'What is the question?',
      rows: [
        row('Title', 'question', contents.title || unsaid),
        row('Abstract', 'question', abstractWords(contents)),
        row('Category', 'question', contents.category || unsaid),
        row('Justification', 'papers', papers.justification),
        row('Without names', 'papers', papers.recognised),
      ],
    },
    {
      question: 'Where is it?',
      rows: [
        row('Targets', 'targets', targetWords(contents)),
        ...computation.groups.map((group) =>
          row(group.name, 'targets', `${groupSentence(group)} ${groupHoursSentence(group)}`),
        ),
        ...contents.targets.flatMap((target) => {
          const awaited = awaitedWords(target)
          return awaited ? [row(target.name, 'targets', awaited)] : []
        }),
        row('Cosmology', 'cosmology', cosmologyWords(contents)),
      ],
    },
    {
      question: 'What must be measured?',
      rows: [
        row('Observing', 'observing', observingWords(contents)),
        ...wishLines(contents).map((line) => row(line.instrument, 'observing', wishWords(line))),
      ],
    },
    {
      question: 'Can it be done?',
      rows: [
        row(
          'Hours',
          'observing',
          `${asked} asked, ${needed} needed; ${formatNights(computation.askedNights)}`,
        ),
        row('Verdict', 'feasibility', checksWords(computation)),
      ],
    },
    {
      question: 'Who asks?',
      rows: [
        row('Leads', 'people', leads.join(', ') || unsaid),
        row('With', 'people', others.join(', ') || 'nobody else'),
        ...(without.length > 0 ? [row('Left out', 'people', leftOutWords(without))] : []),
      ],
    },
  ]
}

/** How many checks are clear, and the first that is not. */
export function checksWords(computation: ProposalComputation): string {
  if (computation.checksTotal === 0) return 'Nothing to check yet'
  const count = `${computation.checksClear} of ${computation.checksTotal} checks clear`
  const first = computation.observations
    .flatMap(({ checks }) => checks)
    .find(({ verdict }) => verdict !== 'feasible')
  return first ? `${count}. ${first.why}` : count
}
