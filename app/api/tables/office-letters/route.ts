import { readLetters } from '@/lib/domain/outbox/readLetters'
import { lettersReply } from '@/lib/domain/outbox/schema'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/office-letters',
  run: async (ctx) => lettersReply.parse(await readLetters(ctx)),
})
