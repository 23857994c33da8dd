import type { AnonymousProposal } from '@/lib/domain/packets/anonymise'
import type { WishLine } from '@/lib/domain/wishes/wishLines'
import {
  formatCalendarDate,
  formatHoursFromSeconds,
  formatList,
  formatNights,
  formatNumber,
} from '@/lib/format'
import type { FactRow } from '../parts/FactRows'
import { cosmologyLine } from './cosmologyLine'
import type { PacketData } from './packetTypes'
import { magnitudeHead, targetRows } from './targetRows'
import { spectrumChartData } from './spectrumChartData'
import { upChartData } from './upChartData'

const moons = { dark: 'dark', grey: 'grey or darker', any: 'any' } as const
const verdictWords = { feasible: 'Feasible', marginal: 'Marginal', 'not-feasible': 'Not feasible' } as const

/** `July to December 2027`, from the first and last evening. */
export function seasonWords(from: string, to: string): string {
  const name = (date: string) =>
    new Intl.DateTimeFormat('en-GB', { month: 'long', timeZone: 'UTC' }).format(new Date(`${date}T00:00:00Z`))
  const [startYear, endYear] = [from.slice(0, 4), to.slice(0, 4)]
  if (startYear !== endYear) return `${name(from)} ${startYear} to ${name(to)} ${endYear}`
  return name(from) === name(to) ? `${name(from)} ${startYear}` : `${name(from)} to ${name(to)} ${startYear}`
}

function factsOf(proposal: AnonymousProposal, wishes: readonly WishLine[]): FactRow[] {
  const { computation, modes, constraintSets, observations, cosmology } = proposal
  const sets = constraintSets.filter(({ id }) => observations.some((o) => o.constraintSetId === id))
  const unique = (values: readonly string[]) => formatList([...new Set(values)])
  return [
    {
      term: 'Telescope',
      value: unique(
        modes.map(({ telescope }) => `${telescope.name}, ${formatNumber(telescope.apertureM, 1)} m`),
      ),
    },
    { term: 'Instrument', value: unique(modes.map(({ instrument }) => instrument.name)) },
    { term: 'Asked', value: formatHoursFromSeconds(computation.askedSeconds), bold: true },
    { term: 'Needed', value: formatHoursFromSeconds(computation.neededSeconds), bold: true },
    {
      term: 'Visit',
      value: formatList(
        wishes.flatMap(({ instrument, visit }) => (visit ? [`${visit} with ${instrument}`] : [])),
      ),
    },
    {
      term: 'Of use from',
      value: formatList(
        wishes.flatMap(({ instrument, least }) => (least ? [`${least} of ${instrument}`] : [])),
      ),
    },
    { term: 'Moon', value: unique(sets.map((set) => moons[set.moon])) },
    {
      term: 'Image, zenith',
      value: unique(sets.map((set) => `${formatNumber(set.imageQualityArcsec, 1)}″ or better`)),
    },
    { term: 'How often', value: unique(sets.flatMap(({ cadence }) => cadence ?? [])) },
    {
      term: 'Needed by',
      value: unique(sets.flatMap(({ dateTo }) => (dateTo ? formatCalendarDate(dateTo) : []))),
    },
    { term: 'Cosmology', value: cosmology.parameters.name },
    { term: 'Checks', value: `${computation.checksClear} of ${computation.checksTotal} clear` },
  ].filter(({ value }) => value !== '')
}

function totalWords({ targets, groups, computation }: AnonymousProposal, required: number): string {
  const count = targets.length === 1 ? '1 target' : `${targets.length} targets`
  const needed = required > 0 || groups.length === 0 ? `, ${required} required` : ''
  return `${count}${needed}; ${formatNights(computation.askedNights)}`
}

/** Each check that is not clear, with the target it belongs to. */
function notesOf({ computation, targets }: AnonymousProposal): PacketData['notes'] {
  return computation.observations.flatMap(({ targetId, checks }) =>
    checks
      .filter(({ verdict }) => verdict !== 'feasible')
      .map((check) => ({
        verdict: check.verdict,
        words: `${verdictWords[check.verdict]}: ${targets.find(({ id }) => id === targetId)?.name ?? ''}`,
        text: [check.why, check.fix ?? ''].join(' ').trim(),
      })),
  )
}

/** The most magnitudes of which it is told one by one how they were carried. */
const mostCarried = 6

function carriedLines({ computation, targets }: AnonymousProposal): string[] {
  const said = computation.observations.flatMap(({ targetId, carried }) =>
    carried ? [`${targets.find(({ id }) => id === targetId)?.name ?? ''}: ${carried.sentence}`] : [],
  )
  const lines = [...new Set(said)]
  const more = lines.length - mostCarried
  return more > 0 ? [...lines.slice(0, mostCarried), `And ${more} more in the report.`] : lines
}

/** What a packet says, from a proposal without names; names are added by whoever may read them. */
export function packetData(
  proposal: AnonymousProposal,
  given: Pick<PacketData, 'label' | 'people' | 'rules'> & { required: number; wishes: readonly WishLine[] },
): PacketData {
  const { computation, call } = proposal
  return {
    observatory: `${proposal.site.name}, call ${call.number}`,
    season: seasonWords(call.seasonFrom, call.seasonTo),
    label: given.label,
    title: proposal.title,
    abstract: proposal.abstract,
    category: proposal.category,
    people: given.people,
    facts: factsOf(proposal, given.wishes),
    magnitudeHead: magnitudeHead(proposal),
    rows: targetRows(proposal),
    total: {
      words: totalWords(proposal, given.required),
      needed: formatNumber(computation.neededSeconds / 3600, 1),
      asked: formatNumber(computation.askedSeconds / 3600, 1),
      verdict: computation.verdict,
    },
    rules: given.rules,
    cosmology: cosmologyLine(proposal),
    carried: carriedLines(proposal),
    up: upChartData(proposal),
    spectra: spectrumChartData(proposal),
    notes: notesOf(proposal),
    written: proposal.written,
  }
}
