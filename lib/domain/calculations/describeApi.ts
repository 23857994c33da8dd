import { z } from 'zod'
import * as answers from './answers'
import { ccdRequest } from './computeCcd'
import { cosmologyRequest } from './computeCosmology'
import { positionsRequest } from './computePositions'
import { visibilityRequest } from './computeVisibility'
import { inverseRequest } from './invertCosmology'

interface Described {
  readonly path: string
  readonly summary: string
  readonly request?: z.ZodType
  readonly answer: z.ZodType
}

const operations: readonly Described[] = [
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
    path: '/api/v1/exposure/ccd',
    summary: 'Signal-to-noise from time, or time from signal-to-noise',
    request: ccdRequest,
    answer: answers.ccdAnswer,
  },
]

function schemaOf(schema: z.ZodType, io: 'input' | 'output'): Record<string, unknown> {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, { io, target: 'draft-2020-12' })
  return rest
}

const problem = {
  description: '',
  content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
}

function operationOf({ path, summary, request, answer }: Described) {
  const refused = {
    '413': { ...problem, description: 'More than one call may ask for.' },
    '422': { ...problem, description: 'A value that cannot be read, or that this model cannot have.' },
  }
  return {
    operationId: path.slice('/api/v1/'.length).replaceAll('/', '-'),
    summary,
    ...(request
      ? {
          requestBody: {
            required: true,
            content: { 'application/json': { schema: schemaOf(request, 'input') } },
          },
        }
      : {}),
    responses: {
      '200': {
        description: 'The answer; with Accept: text/csv its rows as CSV.',
        content: {
          'application/json': { schema: schemaOf(answer, 'output') },
          'text/csv': { schema: { type: 'string' } },
        },
      },
      ...(request ? refused : {}),
      '429': { ...problem, description: 'Too often; Retry-After says how many seconds to wait.' },
    },
  }
}

/** The public calculations as an OpenAPI 3.1 document, made from the schemas that check the requests. */
export function describeApi() {
  return {
    openapi: '3.1.0',
    info: {
      title: 'Noctuary calculations',
      version: '1',
      description:
        'Open without sign-in. Units are in the names of fields; angles in degrees, east longitudes positive, times ISO 8601 UTC. A value a model cannot have fails the whole call and is named by its JSON pointer.',
    },
    jsonSchemaDialect: 'https://json-schema.org/draft/2020-12/schema',
    security: [],
    paths: Object.fromEntries(
      operations.map((described) => [
        described.path,
        { [described.request ? 'post' : 'get']: operationOf(described) },
      ]),
    ),
    components: { schemas: { Problem: schemaOf(answers.problemAnswer, 'output') } },
  }
}
