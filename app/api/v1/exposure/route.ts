import { computeExposure } from '@/lib/domain/calculations/computeExposure'
import { exposureRequest } from '@/lib/domain/calculations/exposureSchema'
import { defineRoute } from '@/lib/http/defineRoute'
import { jsonOrCsv } from '@/lib/http/jsonOrCsv'

export const POST = defineRoute({
  name: 'POST /api/v1/exposure',
  body: exposureRequest,
  limit: { points: 60, seconds: 60 },
  run: async (ctx, { body, request }) => {
    const answer = await computeExposure(ctx, body)
    const { mode, records, limit, varianceE2, noise, ...row } = answer
    const flat = {
      ...row,
      mode: mode.slug,
      limitAb: limit?.ab ?? null,
      limitFluxErgSCm2: limit?.fluxErgSCm2 ?? null,
      sourceE2: varianceE2.source,
      skyE2: varianceE2.sky,
      darkE2: varianceE2.dark,
      readE2: varianceE2.read,
      floorE2: varianceE2.floor,
      noiseMostly: noise.mostly,
      noiseShare: noise.share,
      siteRecord: records.site,
      telescopeRecord: records.telescope,
      modeRecord: records.mode,
    }
    return jsonOrCsv(request, answer, [flat])
  },
})
