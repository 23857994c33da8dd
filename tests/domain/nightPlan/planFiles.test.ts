import { describe, expect, it } from 'vitest'
import { obsPlanCsv } from '@/lib/domain/nightPlan/obsPlanCsv'
import { planCalendar } from '@/lib/domain/nightPlan/planCalendar'
import { planCsv } from '@/lib/domain/nightPlan/planCsv'
import type { NightPlan, PlannedPart, PlannedPiece } from '@/lib/domain/nightPlan/types'
import { csvRows as rows } from '../../support/csvRows'

// Seen to fail with wavelengths left in ångström, with the end of a window taken from its last bin, with whole days ending
// on their last evening, and with the hours that find no place left out.

const h = 3600
const piece = (
  from: string,
  to: string,
  seconds: number,
  more: Partial<PlannedPiece> = {},
): PlannedPiece => ({
  fromEvening: from.slice(0, 10),
  toEvening: to.slice(0, 10),
  siderealFromH: 4,
  moon: 'dark',
  ofNight: null,
  seconds,
  from: new Date(from),
  to: new Date(to),
  ...more,
})
const part = (more: Partial<PlannedPart> = {}): PlannedPart => ({
  ...{ number: '14-071', title: 'Gas, and “more”', rank: 3, choice: null, telescope: 'Aldous' },
  ...{ site: 'Quillon Ridge Observatory', instrumentId: 2, instrument: 'SPINDLE', observationId: 18 },
  mode: { name: 'SPINDLE, blue', fromA: 3600, toA: 5900, resolvingPower: 1400 },
  target: { name: 'QR J0348−0149', raDeg: 57.055, decDeg: -1.8285833333333332 },
  ...{
    service: 'queue',
    conditions: '',
    isReserve: false,
    seconds: 7 * h,
    givenAt: new Date('2000-01-01T12:00Z'),
  },
  pieces: [
    piece('2027-08-02T23:00Z', '2027-08-14T02:00Z', 4 * h),
    piece('2027-09-03T00:00Z', '2027-09-09T06:00Z', 1.5 * h, { moon: 'grey' }),
    piece('2027-08-01T23:00Z', '2027-08-05T01:00Z', 1 * h),
  ],
  ...more,
})
const plan = (...parts: PlannedPart[]): NightPlan => ({
  callNumber: 14,
  callSlug: 'call-14',
  version: 9,
  parts,
})

describe('the plan as a file', () => {
  it('has a line for each bin, and one for what finds no place', () => {
    const found = rows(planCsv(plan(part())))
    expect(found.map((row) => [row['First evening'], row['Moonlight'], row['Hours']])).toEqual([
      ['2027-08-02', 'dark', '4'],
      ['2027-09-03', 'grey', '1.5'],
      ['2027-08-01', 'dark', '1'],
      ['', '', '0.5'],
    ])
    expect(found[0]).toMatchObject({ Proposal: '14-071', Title: 'Gas, and “more”', Target: 'QR J0348−0149' })
    expect(rows(planCsv(plan()))).toEqual([])
  })
})

/** Name, type and unit of each column: ObsLocTAP 1.0, tables of sections 3.1 and 3.4; what may not be null after it. */
const obsplan: readonly (readonly [name: string, type: 'double' | 'integer' | 'text', isNeeded?: true])[] = [
  ['t_planning', 'double', true],
  ['target_name', 'text'],
  ['obs_id', 'text', true],
  ['obs_collection', 'text'],
  ['s_ra', 'double'],
  ['s_dec', 'double'],
  ['s_fov', 'double'],
  ['s_region', 'text'],
  ['s_resolution', 'double'],
  ['t_min', 'double'],
  ['t_max', 'double'],
  ['t_exptime', 'double'],
  ['t_resolution', 'double'],
  ['em_min', 'double'],
  ['em_max', 'double'],
  ['em_res_power', 'double'],
  ['o_ucd', 'text'],
  ['pol_states', 'text'],
  ['pol_xel', 'integer'],
  ['facility_name', 'text', true],
  ['instrument_name', 'text'],
  ['t_plan_exptime', 'double'],
  ['category', 'text', true],
  ['priority', 'integer', true],
  ['execution_status', 'text', true],
  ['tracking_type', 'text', true],
]

describe('the plan with the columns of ObsLocTAP', () => {
  const parts = [
    part(),
    part({ observationId: 19, choice: 'must', pieces: [] }),
    part({ observationId: 20, choice: 'filler', target: null, mode: null }),
    part({ observationId: 21, isReserve: true, target: { name: 'GRB trigger', raDeg: null, decDeg: null } }),
  ]
  const text = obsPlanCsv(plan(...parts))

  it('has those columns, each of its type, and none empty that may not be', () => {
    expect(text.split('\r\n')[0]).toBe(obsplan.map(([name]) => name).join(','))
    for (const row of rows(text))
      for (const [name, type, isNeeded] of obsplan) {
        const cell = row[name] ?? ''
        if (isNeeded) expect(cell).not.toBe('')
        if (cell === '' || type === 'text') continue
        expect(Number.isFinite(Number(cell))).toBe(true)
        if (type === 'integer') expect(cell).toMatch(/^-?\d+$/)
      }
  })

  it('counts times in MJD, wavelengths in metres, places in degrees and durations in seconds', () => {
    expect(rows(text)[0]).toMatchObject({
      // J2000.0 less half a day is MJD 51544; 2027 August 1 is MJD 61618 (Meeus 1998, chapter 7).
      t_planning: '51544.5',
      t_min: String(61618 + Number((23 / 24).toFixed(6))),
      t_max: '61657.25',
      em_min: '3.6e-7',
      em_max: '5.9e-7',
      em_res_power: '1400',
      s_ra: '57.055',
      s_dec: '-1.8285833',
      t_plan_exptime: String(7 * h),
      facility_name: 'Aldous, Quillon Ridge Observatory',
    })
  })

  it('takes its words from the lists of the standard, and an id only once', () => {
    const found = rows(text)
    expect(found.map((row) => row.priority)).toEqual(['1', '2', '0', '0'])
    for (const row of found) {
      expect(['Fixed', 'Coordinated', 'Window', 'Other']).toContain(row.category)
      expect(['Planned', 'Scheduled', 'Unscheduled', 'Performed', 'Aborted']).toContain(row.execution_status)
      expect(['Sidereal', 'Solar-system-object-tracking', 'Fixed-az-el-transit']).toContain(row.tracking_type)
    }
    expect(new Set(found.map((row) => row.obs_id)).size).toBe(found.length)
    expect(found[1]).toMatchObject({ t_min: '', t_max: '' })
    expect(found[2]).toMatchObject({ target_name: '', s_ra: '', em_min: '' })
  })
})

describe('the plan as a calendar', () => {
  const where = { origin: 'https://noctuary.example', url: 'https://noctuary.example/panel/call-14/nights' }
  const text = planCalendar(plan(part(), part({ observationId: 19, pieces: [] })), where)
  const values = (name: string) =>
    text
      .replaceAll('\r\n ', '')
      .split('\r\n')
      .flatMap((line) => (line.startsWith(name) ? [line.slice(line.indexOf(':') + 1)] : []))

  it('has an event for each half-month, from its first evening to the day after its last', () => {
    expect(values('DTSTART')).toEqual(['20270801', '20270903'])
    expect(values('DTEND')).toEqual(['20270815', '20270910'])
    expect(values('SUMMARY')[0]).toMatch(/^14-071: 5\.0.h of SPINDLE on Aldous$/)
    expect(values('STATUS')).toEqual(['TENTATIVE', 'TENTATIVE'])
    expect(text.endsWith('END:VCALENDAR\r\n')).toBe(true)
    expect(/[^\r]\n/.test(text)).toBe(false)
  })

  it('keeps an event’s id while its sequence rises', () => {
    const uids = values('UID')
    expect(new Set(uids).size).toBe(2)
    expect(uids[0]).toMatch(/^plan-call-14-14-071-2-\d+@noctuary\.example$/)
    expect(values('SEQUENCE')).toEqual(['9', '9'])
    const later = planCalendar({ ...plan(part({ title: 'Renamed' })), version: 10 }, where)
    for (const uid of uids) expect(later).toContain(uid)
    expect(later).toContain('SEQUENCE:10')
  })

  it('of nothing given is an empty calendar', () => {
    expect(planCalendar(plan(), where)).toContain('BEGIN:VCALENDAR')
    expect(planCalendar(plan(), where)).not.toContain('VEVENT')
  })
})
