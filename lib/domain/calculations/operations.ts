import type { z } from 'zod'
import * as answers from './answers'
import { ccdRequest } from './computeCcd'
import { cosmologyRequest } from './computeCosmology'
import { positionsRequest } from './computePositions'
import { visibilityRequest } from './computeVisibility'
import { exposureRequest } from './exposureSchema'
import { inverseRequest } from './invertCosmology'
import { observeLightRequest } from './observeLightSchema'

export interface Operation {
  readonly path: string
  readonly summary: string
  /** Of a call that sends something; the others are asked with GET. */
  readonly request?: z.ZodType
  readonly answer: z.ZodType
}

/** The public calculations, each with what it takes and what it gives. */
export const operations: readonly Operation[] = [
  {
    path: '/api/v1/cosmologies',
    summary: 'The cosmologies that have a name, with their citations',
    answer: answers.cosmologiesAnswer,
  },
  {
    path: '/api/v1/cosmology',
    summary: 'Distances, times, volumes and scales at redshifts and between pairs of them',
    request: cosmologyRequest,
    answer: answers.cosmologyAnswer,
  },
  {
    path: '/api/v1/cosmology/inverse',
    summary: 'Every redshift at which a quantity has a value',
    request: inverseRequest,
    answer: answers.inverseAnswer,
  },
  {
    path: '/api/v1/light/observe',
    summary: 'What reaches us of a source: magnitude, line, size, dust, intergalactic medium and lens',
    request: observeLightRequest,
    answer: answers.lightAnswer,
  },
  {
    path: '/api/v1/sky/positions',
    summary: 'Sun, Moon and targets above a site at instants',
    request: positionsRequest,
    answer: answers.positionsAnswer,
  },
  {
    path: '/api/v1/sky/visibility',
    summary: 'When targets can be observed, night by night',
    request: visibilityRequest,
    answer: answers.visibilityAnswer,
  },
  {
    path: '/api/v1/modes',
    summary: 'The instrument modes of the observatory',
    answer: answers.modesAnswer,
  },
  {
    path: '/api/v1/exposure',
    summary: 'Signal-to-noise, time or limit with an instrument mode of the observatory',
    request: exposureRequest,
    answer: answers.exposureAnswer,
  },
  {
    path: '/api/v1/exposure/ccd',
    summary: 'Signal-to-noise from time, or time from signal-to-noise, of any detector',
    request: ccdRequest,
    answer: answers.ccdAnswer,
  },
]
