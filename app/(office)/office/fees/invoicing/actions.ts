'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { saveBilling } from '@/lib/domain/billing/saveBilling'
import { billingSchema } from '@/lib/domain/billing/schema'
import { paths } from '@/lib/paths'

export const saveBillingAction = defineAction({
  name: 'saveBilling',
  schema: billingSchema,
  run: saveBilling,
  revalidate: () => [paths.officeInvoicing()],
})
