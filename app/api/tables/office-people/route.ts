import { officePeopleReply } from '@/lib/domain/people/officeSchema'
import { readOfficePeople } from '@/lib/domain/people/readOfficePeople'
import { defineRoute } from '@/lib/http/defineRoute'

export const GET = defineRoute({
  name: 'GET /api/tables/office-people',
  run: async (ctx) => officePeopleReply.parse(await readOfficePeople(ctx)),
})
