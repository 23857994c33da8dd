import { exportPerson } from '@/lib/domain/people/exportPerson'
import { defineRoute } from '@/lib/http/defineRoute'
import { jsonFile } from '@/lib/http/jsonFile'

/** All that is held about whoever asks. */
export const GET = defineRoute({
  name: 'GET /account/data',
  limit: { points: 10, seconds: 3600 },
  run: async (ctx) => jsonFile(await exportPerson(ctx, { personId: ctx.actor.personId })),
})
