import { countInSurvey, surveyRequest } from '@/lib/domain/calculations/countInSurvey'
import { defineRoute } from '@/lib/http/defineRoute'
import { jsonOrCsv } from '@/lib/http/jsonOrCsv'

export const POST = defineRoute({
  name: 'POST /api/v1/cosmology/survey',
  body: surveyRequest,
  maxBytes: 4_000_000,
  limit: { points: 120, seconds: 60 },
  run: async (_, { body, request }) => {
    const answer = countInSurvey(body)
    return jsonOrCsv(request, answer, answer.rows)
  },
})
