'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { erasePerson } from '@/lib/domain/people/erasePerson'
import { personStepSchema } from '@/lib/domain/people/officeSchema'
import { endRole } from '@/lib/domain/roles/endRole'
import { grantRole } from '@/lib/domain/roles/grantRole'
import { endRoleSchema, grantRoleSchema } from '@/lib/domain/roles/schema'
import { paths } from '@/lib/paths'

const here = () => paths.office('people')

export const grantRoleAction = defineAction({
  name: 'grantRole',
  schema: grantRoleSchema,
  run: grantRole,
  revalidate: here,
})

export const erasePersonAction = defineAction({
  name: 'erasePerson',
  schema: personStepSchema,
  run: erasePerson,
  revalidate: here,
})

export const endRoleAction = defineAction({
  name: 'endRole',
  schema: endRoleSchema,
  run: endRole,
  revalidate: here,
})
