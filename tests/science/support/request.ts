import { presetCosmology } from '../../../lib/science/cosmology'
import type { ReportInput, ReportObservation, ReportTarget } from '../../../lib/science/feasibility'
import { ridge, slit } from './instruments'

export const target: ReportTarget = {
  id: 1,
  name: 'Invented quasar',
  raDeg: 12.6,
  decDeg: -17.7,
  redshift: 0.2,
  redshiftType: 'spectroscopic',
  brightness: { value: 19.5, system: 'AB', band: 'r', provenance: 'observed' },
}

export const observation: ReportObservation = {
  id: 1,
  snr: 20,
  snrPer: 'resolution-element',
  feature: { name: 'Hβ', restA: 4862.68 },
  askedS: 1900,
  maxAirmass: 1.8,
  seeingArcsec: 1,
  moon: 'grey',
  minMoonSeparationDeg: 30,
}

/** A request that passes every check, changed where a test says so. */
export function request(change: {
  target?: Partial<ReportTarget>
  observation?: Partial<ReportObservation>
  input?: Partial<ReportInput>
}): ReportInput {
  return {
    cosmology: presetCosmology('planck-2018'),
    site: ridge,
    mode: slit,
    season: { from: '2027-09-01', to: '2027-10-31' },
    target: { ...target, ...change.target },
    observation: { ...observation, ...change.observation },
    ...change.input,
  }
}
