import { problemAnswer } from './answers'
import { describeObservability } from './describeObservability'
import { operations, type Operation } from './operations'
import { schemaOf } from './schemaOf'

const problem = {
  description: '',
  content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
}

function operationOf({ group, path, summary, request, example, answer }: Operation) {
  const refused = {
    '413': { ...problem, description: 'More than one call may ask for.' },
    '415': { ...problem, description: 'A body that does not say it is application/json.' },
    '422': { ...problem, description: 'A value that cannot be read, or that this model cannot have.' },
  }
  return {
    operationId: path.slice('/api/v1/'.length).replaceAll('/', '-'),
    tags: [group],
    summary,
    ...(request
      ? {
          requestBody: {
            required: true,
            content: { 'application/json': { schema: schemaOf(request, 'input'), example } },
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
    paths: {
      ...Object.fromEntries(
        operations.map((operation) => [
          operation.path,
          { [operation.request ? 'post' : 'get']: operationOf(operation) },
        ]),
      ),
      ...describeObservability(),
    },
    components: { schemas: { Problem: schemaOf(problemAnswer, 'output') } },
  }
}
