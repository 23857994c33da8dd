'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { mergePeople } from '@/lib/domain/people/mergePeople'
import { mergeSchema } from '@/lib/domain/people/officeSchema'
import { paths } from '@/lib/paths'

export const mergePeopleAction = defineAction({
  name: 'mergePeople',
  schema: mergeSchema,
  run: mergePeople,
  revalidate: () => paths.office('people'),
})
