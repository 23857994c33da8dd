import type { CallTelescope } from '@/db/queries/callTelescopes'
import { formatList } from '@/lib/format'
import { isCalendarDay } from '../calendarDay'
import { nightUses, type NightUse } from '../calls/nightUseList'
import { delimiterOf, readRecords } from '../targets/csv'
import { calendarHeads } from './calendarFileView'
import { partsProblem } from './partsProblem'
import type { NightPart } from './types'

/** Nights of a file by telescope and evening; or sentences, with their lines, that say why it cannot be taken. */
export type CalendarRead =
  { ok: true; nights: Map<number, Map<string, NightPart[]>> } | { ok: false; problems: string[] }

interface Season {
  from: string
  to: string
}

const mostProblems = 8
const fraction = /^(0|1|0?\.\d{1,3}|1\.0{1,3})$/
/** A spreadsheet's guard against formulas is taken off again. */
const cellText = (text: string | undefined) => (text ?? '').trim().replace(/^'(?=[=+\-@])/, '')
const same = (a: string, b: string) => a.toLowerCase() === b.toLowerCase()

type Line = Record<(typeof calendarHeads)[number], string>

/** One line: its telescope, its evening, and its part; null where the night is for nothing. */
function readLine(
  line: Line,
  telescopes: readonly CallTelescope[],
  season: Season,
): { telescope: CallTelescope; date: string; part: NightPart | null } | string {
  const telescope = telescopes.find(
    ({ name, slug }) => same(name, line.telescope) || same(slug, line.telescope),
  )
  if (!telescope)
    return `there is no telescope “${line.telescope}”; ${formatList(telescopes.map(({ name }) => name))} ${telescopes.length === 1 ? 'is' : 'are'} there`
  const date = line.evening
  if (!isCalendarDay(date)) return `“${date}” is no evening; give it as year-month-day`
  if (date < season.from || date > season.to)
    return `${date} is no night of this call, which runs from ${season.from} to ${season.to}`
  if (same(line.use, 'none')) return { telescope, date, part: null }
  const useFor = nightUses.find((use) => same(use, line.use))
  if (!useFor) return `“${line.use}” is no use; say science, engineering, promised or none`
  const [from, to] = [line.from || '0', line.to || '1']
  if (!fraction.test(from) || !fraction.test(to))
    return `“${from}” to “${to}” is no part of a night; give fractions from 0 to 1`
  const instrument = telescope.instruments.find(({ name }) => same(name, line.instrument))
  if (line.instrument !== '' && !instrument) return `${telescope.name} has no instrument “${line.instrument}”`
  if ([...line.note].length > 120) return 'a note has at most 120 characters'
  const part = { from: Number(from), to: Number(to), useFor: useFor satisfies NightUse }
  return { telescope, date, part: { ...part, instrumentId: instrument?.id ?? null, note: line.note } }
}

/** Reads a night calendar from text. All of it is right, or none is taken. */
export function readCalendarCsv(
  text: string,
  telescopes: readonly CallTelescope[],
  season: Season,
): CalendarRead {
  const plain = text.replace(/^\uFEFF/, '')
  const delimiter = delimiterOf(plain.split(/\r?\n/, 1)[0] ?? '')
  const [heads = [], ...records] = readRecords(plain, delimiter)
  const at = new Map(calendarHeads.map((head) => [head, heads.findIndex((one) => same(one.trim(), head))]))
  const lacking = calendarHeads.slice(0, 5).filter((head) => at.get(head) === -1)
  if (lacking.length > 0)
    return {
      ok: false,
      problems: [`The first line names no column ${formatList(lacking.map((head) => `“${head}”`))}.`],
    }
  if (records.length === 0) return { ok: false, problems: ['The file has no nights.'] }

  const problems: string[] = []
  const nights = new Map<number, Map<string, NightPart[]>>()
  for (const [index, record] of records.entries()) {
    const cells = calendarHeads.map((head) => [head, cellText(record[at.get(head) ?? -1])] as const)
    const read = readLine(Object.fromEntries(cells) as Line, telescopes, season)
    if (typeof read === 'string') {
      problems.push(`Line ${index + 2}: ${read}.`)
      continue
    }
    const own = nights.get(read.telescope.id) ?? new Map<string, NightPart[]>()
    nights.set(read.telescope.id, own)
    const parts = [...(own.get(read.date) ?? []), ...(read.part ? [read.part] : [])]
    own.set(read.date, parts)
    const problem = read.part && partsProblem(parts, read.telescope.instruments)
    if (problem) problems.push(`Line ${index + 2}: ${problem}`)
  }
  if (problems.length === 0) return { ok: true, nights }
  const more = problems.length - mostProblems
  return {
    ok: false,
    problems: more > 0 ? [...problems.slice(0, mostProblems), `And ${more} more.`] : problems,
  }
}
