import { csvText, type CsvValue } from '@/lib/format'
import { mjdOf } from '@/lib/science/sky'
import type { NightPlan, PlannedPart } from './types'

/** Columns of the table ivoa.obsplan in their order: ObsLocTAP 1.0, IVOA Recommendation 2021-07-24, section 3. */
const columns = [
  't_planning',
  'target_name',
  'obs_id',
  'obs_collection',
  's_ra',
  's_dec',
  's_fov',
  's_region',
  's_resolution',
  't_min',
  't_max',
  't_exptime',
  't_resolution',
  'em_min',
  'em_max',
  'em_res_power',
  'o_ucd',
  'pol_states',
  'pol_xel',
  'facility_name',
  'instrument_name',
  't_plan_exptime',
  'category',
  'priority',
  'execution_status',
  'tracking_type',
] as const

type Column = (typeof columns)[number]

const metresOf = (wavelengthA: number) => Number((wavelengthA * 1e-10).toPrecision(12))
/** To 0.4 milliarcseconds. */
const degrees = (deg: number | null | undefined) =>
  deg === null || deg === undefined ? undefined : Number(deg.toFixed(7))
const mjd = (at: Date) => Number(mjdOf(at).toFixed(6))

/** Hard to move where it must be, easily moved where it only fills what others leave. */
function priorityOf({ choice, isReserve }: PlannedPart): 0 | 1 | 2 {
  if (isReserve || choice === 'filler') return 0
  return choice === 'must' ? 2 : 1
}

/** A part as a row: times in MJD days, positions in ICRS degrees, wavelengths in metres, durations in seconds. */
function rowOf(part: PlannedPart, callNumber: number): Partial<Record<Column, CsvValue>> {
  const { number, observationId, target, pieces, mode, seconds } = part
  const times = pieces.flatMap(({ from, to }) => [from.getTime(), to.getTime()])
  // A window: on which of its nights it is, is decided under the sky.
  const window =
    times.length > 0
      ? { t_min: mjd(new Date(Math.min(...times))), t_max: mjd(new Date(Math.max(...times))) }
      : {}
  return {
    t_planning: mjd(part.givenAt),
    target_name: target?.name,
    obs_id: `${number}-${observationId}-${part.instrumentId}`,
    obs_collection: `Call ${callNumber}`,
    s_ra: degrees(target?.raDeg),
    s_dec: degrees(target?.decDeg),
    ...window,
    em_min: mode ? metresOf(mode.fromA) : undefined,
    em_max: mode ? metresOf(mode.toA) : undefined,
    em_res_power: mode?.resolvingPower ?? undefined,
    facility_name: `${part.telescope}, ${part.site}`,
    instrument_name: part.instrument,
    t_plan_exptime: seconds,
    category: 'Window',
    priority: priorityOf(part),
    execution_status: 'Planned',
    tracking_type: 'Sidereal',
  }
}

/** A row for each night of a visit, at its own time: it cannot be moved, and its observers choose their targets. */
function nightRows(part: PlannedPart, callNumber: number): Partial<Record<Column, CsvValue>>[] {
  return part.pieces.map(({ from, to, seconds, fromEvening }) => ({
    ...rowOf(part, callNumber),
    obs_id: `${part.number}-visit-${part.instrumentId}-${fromEvening}`,
    t_min: mjd(from),
    t_max: mjd(to),
    t_plan_exptime: seconds,
    category: 'Fixed',
    priority: 2,
    execution_status: 'Scheduled',
  }))
}

/**
 * The night plan with the column names, types and units of ObsLocTAP 1.0. The queue is not scheduled yet: its rows are
 * Planned within a window, those of visits Scheduled on their nights. What is known only once it is observed stays empty.
 */
export function obsPlanCsv({ callNumber, parts }: NightPlan): string {
  return csvText(
    columns,
    parts.flatMap((part) => {
      const rows = part.observationId === null ? nightRows(part, callNumber) : [rowOf(part, callNumber)]
      return rows.map((row) => columns.map((column) => row[column]))
    }),
  )
}
