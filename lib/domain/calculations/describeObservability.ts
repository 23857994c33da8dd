import { observabilityQuery } from '../observability/readAsked'
import { schemaOf } from './schemaOf'

const text = { schema: { type: 'string' } }
const failed = { content: { 'application/x-votable+xml': text } }
const tooOften = {
  '429': { ...failed, description: 'Too often; Retry-After says how many seconds to wait.' },
}

const tags = ['Virtual observatory']

const answered = {
  tags,
  summary: 'When a position can be observed, as clients of the virtual observatory ask (ObjObsSAP, draft)',
  responses: {
    '200': {
      description: 'A VOTable whose QUERY_STATUS is OK or OVERFLOW, or CSV.',
      content: { 'application/x-votable+xml': text, 'text/xml': text, 'text/csv': text },
    },
    '400': { ...failed, description: 'A VOTable whose QUERY_STATUS is ERROR.' },
    ...tooOften,
  },
}

const told = (resource: string, summary: string) => ({
  get: {
    operationId: `vo-observability-${resource}`,
    tags,
    summary,
    responses: {
      '200': { description: 'The document.', content: { 'text/xml': text } },
      ...tooOften,
    },
  },
})

/** The resources of the virtual observatory for the OpenAPI document: a query in its address or as a form. */
export function describeObservability() {
  const query = schemaOf(observabilityQuery, 'input') as {
    properties: Record<string, Record<string, unknown>>
    required: string[]
  }
  const parameters = Object.entries(query.properties).map(([name, { description, ...schema }]) => ({
    name,
    in: 'query',
    required: query.required.includes(name),
    description,
    schema,
  }))
  const form = {
    required: true,
    content: { 'application/x-www-form-urlencoded': { schema: query } },
  }
  const large = { '413': { ...failed, description: 'More than a form may hold.' } }
  const foreign = { '415': { ...failed, description: 'A body that does not say it is a form.' } }
  return {
    '/api/vo/observability/query': {
      get: { operationId: 'vo-observability-query', ...answered, parameters },
      post: {
        operationId: 'vo-observability-query-form',
        tags,
        summary: answered.summary,
        requestBody: form,
        responses: { ...answered.responses, ...large, ...foreign },
      },
    },
    '/api/vo/observability/availability': told('availability', 'Whether queries are answered (VOSI 1.1)'),
    '/api/vo/observability/capabilities': told('capabilities', 'What the service can do (VOSI 1.1)'),
  }
}
