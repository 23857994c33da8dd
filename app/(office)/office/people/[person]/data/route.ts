import { z } from 'zod'
import { exportPerson } from '@/lib/domain/people/exportPerson'
import { defineRoute } from '@/lib/http/defineRoute'
import { jsonFile } from '@/lib/http/jsonFile'

/** All that is held about a person, for the office when it is asked. */
export const GET = defineRoute({
  name: 'GET /office/people/[person]/data',
  params: z.object({ person: z.string().regex(/^\d{1,9}$/, 'A person is given by a number.') }),
  limit: { points: 60, seconds: 3600 },
  run: async (ctx, { params }) => jsonFile(await exportPerson(ctx, { personId: Number(params.person) })),
})
