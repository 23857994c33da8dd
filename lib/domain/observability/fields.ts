import type { Observability } from './findObservability'

interface Field {
  name: string
  datatype: string
  arraysize?: string
  unit?: string
  ucd?: string
  utype?: string
  ref?: string
  description: string
}

const mjd = { datatype: 'double', unit: 'd', ref: 'utc' }
const text = { datatype: 'char', arraysize: '*' }
const limits = 'Char.TimeAxis.Coverage.Bounds.Limits'

/**
 * Columns of an answer, as the draft names them (ObjObsSAP 1.0, working draft of 2024 October 27, section 4.1.1).
 * Double where it says float: a float holds a modified Julian date to six minutes only.
 */
export const fields: readonly Field[] = [
  {
    name: 't_validity',
    ...mjd,
    ucd: 'time.validity',
    utype: 'Char.TimeAxis.Coverage.Time',
    description: 'End of the time looked through; until then the windows stand as computed',
  },
  {
    name: 't_start',
    ...mjd,
    ucd: 'time.start',
    utype: `${limits}.StartTime`,
    description: 'Start of the window',
  },
  { name: 't_stop', ...mjd, ucd: 'time.end', utype: `${limits}.StopTime`, description: 'End of the window' },
  {
    name: 't_observability',
    datatype: 'double',
    unit: 's',
    ucd: 'time.duration',
    utype: 'Char.TimeAxis.Coverage.Support.Extent',
    description: 'Length of the window',
  },
  {
    name: 'facility',
    ...text,
    ucd: 'meta.id;instr.tel',
    utype: 'Provenance.ObsConfig.Facility.name',
    description: 'Telescope the window is for',
  },
  {
    name: 'validity_predictor',
    ...text,
    description: 'Engine the window was computed with, and its version',
  },
]

/** The cells of a row, in the order of the columns. */
export function rowCells(found: Observability, row: Observability['rows'][number]): string[] {
  return [
    found.toMjd.toFixed(8),
    row.startMjd.toFixed(8),
    row.stopMjd.toFixed(8),
    ((row.stopMjd - row.startMjd) * 86_400).toFixed(3),
    row.facility,
    `Noctuary sky ${found.engine}`,
  ]
}
