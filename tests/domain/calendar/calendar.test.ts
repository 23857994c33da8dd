import { describe, expect, it } from 'vitest'
import { nightMove } from '@/components/calendar/nightMove'
import { calendarCsv } from '@/lib/domain/calendar/calendarFileView'
import { offeredTwiceWords } from '@/lib/domain/calendar/offeredTwiceWords'
import { halfMonths } from '@/lib/domain/calendar/halfMonths'
import { partsProblem } from '@/lib/domain/calendar/partsProblem'
import { readCalendarCsv } from '@/lib/domain/calendar/readCalendarCsv'
import type { CalendarNight, NightPart, TelescopeCalendar } from '@/lib/domain/calendar/types'

// Seen to fail: overlaps looked for in the order given only, the 16th counted to the first half, and a file taken in
// part.

const instruments = [
  { id: 1, name: 'LANTERN' },
  { id: 2, name: 'EMBER' },
]
const part = (from: number, to: number, over: Partial<NightPart> = {}): NightPart => ({
  from,
  to,
  useFor: 'science',
  instrumentId: null,
  note: '',
  ...over,
})

describe('a night divided', () => {
  it.each([
    ['into nothing', [], null],
    ['into halves', [part(0.5, 1), part(0, 0.5, { useFor: 'engineering' })], null],
    ['with a gap', [part(0, 0.25), part(0.75, 1)], null],
    ['with an instrument of the telescope', [part(0, 1, { instrumentId: 2 })], null],
    [
      'twice over',
      [part(0.4, 1, { useFor: 'promised' }), part(0, 0.5)],
      'Two parts of a night overlap: 0 to 0.5 for science, and 0.4 to 1 for time promised.',
    ],
    ['backwards', [part(0.5, 0.5)], 'A part must end after it begins: 0.5 to 0.5 for science does not.'],
    [
      'too finely',
      [part(0, 0.33333)],
      'Parts of a night are fractions from 0 to 1, with at most three decimals.',
    ],
    [
      'beyond its end',
      [part(0, 1.2)],
      'Parts of a night are fractions from 0 to 1, with at most three decimals.',
    ],
    [
      'with a strange instrument',
      [part(0, 1, { instrumentId: 9 })],
      'This instrument is not on this telescope.',
    ],
  ])('%s', (_, parts, sentence) => {
    expect(partsProblem(parts, instruments)).toBe(sentence)
  })
})

const night = (date: string, parts: CalendarNight['parts']): CalendarNight => ({
  date,
  darkSeconds: 36_000,
  moonLit: 0.5,
  parts,
})
const nights = [
  night('2027-08-15', [{ ...part(0, 1), darkSeconds: 36_000 }]),
  night('2027-08-16', [
    { ...part(0, 0.5, { instrumentId: 1 }), darkSeconds: 18_000 },
    { ...part(0.5, 1, { useFor: 'promised', note: 'partners, north' }), darkSeconds: 18_000 },
  ]),
  night('2027-08-17', []),
]
const total = {
  darkSeconds: 0,
  scienceSeconds: 0,
  boundSeconds: 0,
  engineeringSeconds: 0,
  promisedSeconds: 0,
  freeSeconds: 0,
}
const aldous: TelescopeCalendar = {
  id: 5,
  name: 'Aldous',
  instruments,
  nights,
  elsewhere: [],
  halves: [],
  total,
  awardedSeconds: 0,
}
const telescopes = [{ id: 5, slug: 'aldous', name: 'Aldous', instruments }]
const season = { from: '2027-08-01', to: '2028-01-31' }

it('sums a season by half-month, the second from the 16th', () => {
  expect(halfMonths(nights)).toEqual([
    {
      ...total,
      from: '2027-08-15',
      to: '2027-08-15',
      nights: 1,
      darkSeconds: 36_000,
      scienceSeconds: 36_000,
    },
    {
      ...total,
      from: '2027-08-16',
      to: '2027-08-17',
      nights: 2,
      darkSeconds: 72_000,
      scienceSeconds: 18_000,
      boundSeconds: 18_000,
      promisedSeconds: 18_000,
      freeSeconds: 36_000,
    },
  ])
})

describe('the calendar as a file', () => {
  it('comes back as it went', () => {
    const read = readCalendarCsv(calendarCsv([aldous]), telescopes, season)
    expect(read.ok && [...(read.nights.get(5) ?? [])]).toEqual(
      nights.map(({ date, parts }) => [date, parts.map(({ darkSeconds: _, ...rest }) => rest)]),
    )
  })

  const head = 'telescope,evening,from,to,use,instrument,note'
  it.each([
    ['nothing', '', /names no column/],
    ['other heads', 'night,use\n1,2', /“telescope”/],
    ['heads alone', head, /no nights/],
    [
      'a strange telescope',
      `${head}\nFennel,2027-08-15,0,1,science,,`,
      /Line 2: there is no telescope “Fennel”; Aldous is there/,
    ],
    ['a wrong day', `${head}\nAldous,2027-02-30x,0,1,science,,`, /Line 2: “2027-02-30x” is no evening/],
    ['a night outside', `${head}\nAldous,2028-03-01,0,1,science,,`, /runs from 2027-08-01 to 2028-01-31/],
    ['a wrong use', `${head}\nAldous,2027-08-15,0,1,sleep,,`, /“sleep” is no use/],
    ['a wrong part', `${head}\nAldous,2027-08-15,0,110%,science,,`, /is no part of a night/],
    ['a wrong instrument', `${head}\nAldous,2027-08-15,0,1,science,WICK,`, /has no instrument “WICK”/],
    [
      'an overlap',
      `${head}\nAldous,2027-08-15,0,0.6,science,,\nAldous,2027-08-15,0.5,1,promised,,`,
      /Line 3: Two parts of a night overlap/,
    ],
  ])('is refused with %s, in words and by line', (_, text, sentence) => {
    const read = readCalendarCsv(text, telescopes, season)
    expect(read.ok ? '' : read.problems.join(' ')).toMatch(sentence)
  })

  it('reads what a spreadsheet wrote: a mark at its start, semicolons, a guard against formulas', () => {
    const text = `\uFEFFEvening;Telescope;Use;From;To;Note\r\n2027-08-15;ALDOUS;Promised;0;.5;"'-half; of it"\r\n`
    const read = readCalendarCsv(text, telescopes, season)
    expect(read.ok && read.nights.get(5)?.get('2027-08-15')).toEqual([
      part(0, 0.5, { useFor: 'promised', note: '-half; of it' }),
    ])
  })

  it('names eight faults at most', () => {
    const text = [head, ...Array.from({ length: 12 }, () => 'Aldous,2027-08-15,0,1,sleep,,')].join('\n')
    const read = readCalendarCsv(text, telescopes, season)
    expect(read.ok ? [] : read.problems).toHaveLength(9)
  })
})

it.each([
  ['2027-08-15', 'ArrowRight', '2027-08-16'],
  ['2027-08-15', 'ArrowLeft', null],
  ['2027-08-31', 'ArrowDown', '2027-09-30'],
  ['2027-09-30', 'ArrowUp', '2027-08-30'],
  ['2027-08-20', 'Home', '2027-08-15'],
  ['2027-08-20', 'End', '2027-10-02'],
  ['2027-10-02', 'ArrowDown', null],
  ['2027-08-20', 'Enter', null],
])('from %s %s leads to %s', (date, key, to) => {
  const all = Array.from({ length: 49 }, (_, i) => ({
    date: new Date(Date.UTC(2027, 7, 15 + i)).toISOString().slice(0, 10),
  }))
  expect(nightMove(all, date, key)).toBe(to)
})

// Seen to fail: with ends that only touch counted as the same part, and with engineering counted as offered.
describe('a night of another call', () => {
  const elsewhere = [
    { eveningDate: '2027-07-10', from: 0, to: 0.5, callNumber: 15 },
    { eveningDate: '2027-07-12', from: 0, to: 1, callNumber: 16 },
  ]
  const on = (eveningDate: string, from: number, to: number, over: Partial<NightPart> = {}) => ({
    ...part(from, to, over),
    eveningDate,
  })
  const said = (...parts: ReturnType<typeof on>[]) => offeredTwiceWords('Fennel 1.5 m', parts, elsewhere)

  it.each([
    ['the other half', on('2027-07-10', 0.5, 1), null],
    ['another night', on('2027-07-11', 0, 1), null],
    ['engineering there', on('2027-07-10', 0, 1, { useFor: 'engineering' }), null],
    [
      'a moment of it',
      on('2027-07-10', 0.499, 1),
      'Call 15 offers Fennel 1.5 m on the night of 10 July 2027 already. A part of a night is offered by one call.',
    ],
  ])('%s', (_, one, sentence) => expect(said(one)).toBe(sentence))

  it('is named first of several', () => {
    expect(said(on('2027-07-12', 0, 1), on('2027-07-10', 0, 1))).toMatch(
      /^Call 15 offers .* 10 July 2027 already, and one more night of these\. /,
    )
  })
})
