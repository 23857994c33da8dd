import type { z } from 'zod'
import * as answers from './answers'
import { ccdRequest } from './computeCcd'
import { cosmologyRequest } from './computeCosmology'
import { positionsRequest } from './computePositions'
import { visibilityRequest } from './computeVisibility'
import { exposureRequest } from './exposureSchema'
import { inverseRequest } from './invertCosmology'
import { observeLightRequest } from './observeLightSchema'
import { surveyRequest } from './countInSurvey'
import { surveyAnswer } from './surveyAnswer'

export interface Operation {
  /** What it is about, for a heading. */
  readonly group: 'Cosmology' | 'Light' | 'Sky' | 'Exposure'
  readonly path: string
  readonly summary: string
  /** Of a call that sends something; the others are asked with GET. */
  readonly request?: z.ZodType
  /** A request that is answered. */
  readonly example?: object
  readonly answer: z.ZodType
}

const site = { latitudeDeg: -37.4, longitudeDeg: -70.2, elevationM: 2390 }
const targets = [{ id: '3C 273', raDeg: 187.2779, decDeg: 2.0524 }]

/** The public calculations, each with what it takes and what it gives. */
export const operations: readonly Operation[] = [
  {
    group: 'Cosmology',
    path: '/api/v1/cosmologies',
    summary: 'The cosmologies that have a name, with their citations',
    answer: answers.cosmologiesAnswer,
  },
  {
    group: 'Cosmology',
    path: '/api/v1/cosmology',
    summary: 'Distances, times, volumes and scales at redshifts and between pairs of them',
    request: cosmologyRequest,
    example: { cosmology: 'planck-2018', z: [0.5, 1, 2], pairs: [[0.5, 2]] },
    answer: answers.cosmologyAnswer,
  },
  {
    group: 'Cosmology',
    path: '/api/v1/cosmology/inverse',
    summary: 'Every redshift at which a quantity has a value',
    request: inverseRequest,
    example: { cosmology: 'planck-2018', quantity: 'angularDiameterMpc', values: [1500] },
    answer: answers.inverseAnswer,
  },
  {
    group: 'Cosmology',
    path: '/api/v1/cosmology/survey',
    summary: 'Volumes of the shells of a survey, and what is expected to be counted in them',
    request: surveyRequest,
    example: {
      cosmology: 'planck-2018',
      areaDeg2: 1.5,
      edges: [0.5, 1, 1.5],
      densityMpc3: 1e-3,
      stellarMass: '10.0-10.5',
    },
    answer: surveyAnswer,
  },
  {
    group: 'Light',
    path: '/api/v1/light/observe',
    summary: 'What reaches us of a source: magnitude, line, size, dust, intergalactic medium and lens',
    request: observeLightRequest,
    example: {
      cosmology: 'planck-2018',
      z: 2,
      absoluteMagnitudeAb: -21,
      magnitudeWavelengthA: 6261,
      ebv: 0.05,
      restWavelengthsA: [1215.67, 5008.24],
    },
    answer: answers.lightAnswer,
  },
  {
    group: 'Sky',
    path: '/api/v1/sky/positions',
    summary: 'Sun, Moon and targets above a site at instants',
    request: positionsRequest,
    example: { site, targets, instants: ['2027-03-05T06:00:00Z'] },
    answer: answers.positionsAnswer,
  },
  {
    group: 'Sky',
    path: '/api/v1/sky/visibility',
    summary: 'When targets can be observed, night by night',
    request: visibilityRequest,
    example: { site, targets, from: '2027-03-01', to: '2027-03-31', maxAirmass: 1.8 },
    answer: answers.visibilityAnswer,
  },
  {
    group: 'Exposure',
    path: '/api/v1/modes',
    summary: 'The instrument modes of the observatory',
    answer: answers.modesAnswer,
  },
  {
    group: 'Exposure',
    path: '/api/v1/exposure',
    summary: 'Signal-to-noise, time or limit with an instrument mode of the observatory',
    request: exposureRequest,
    example: {
      mode: 'lantern-r',
      source: { kind: 'magnitude', ab: 23.5 },
      conditions: { airmass: 1.2, seeingArcsec: 0.8, moon: 'dark' },
      solve: 'time',
      snr: 20,
    },
    answer: answers.exposureAnswer,
  },
  {
    group: 'Exposure',
    path: '/api/v1/exposure/ccd',
    summary: 'Signal-to-noise from time, or time from signal-to-noise, of any detector',
    request: ccdRequest,
    example: {
      sourceRate: 20,
      skyRatePerPixel: 5,
      darkRatePerPixel: 0.001,
      readNoise: 4,
      pixels: 25,
      exposures: 3,
      solve: 'snr',
      timeS: 900,
    },
    answer: answers.ccdAnswer,
  },
]
