'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { saveBulkLetter } from '@/lib/domain/bulkLetters/saveBulkLetter'
import { bulkStepSchema, saveBulkLetterSchema, sendBulkLetterSchema } from '@/lib/domain/bulkLetters/schema'
import { sendBulkLetter } from '@/lib/domain/bulkLetters/sendBulkLetter'
import { stopBulkLetter } from '@/lib/domain/bulkLetters/stopBulkLetter'
import { paths } from '@/lib/paths'

const here = () => paths.bulkLetters()

export const saveBulkLetterAction = defineAction({
  name: 'saveBulkLetter',
  schema: saveBulkLetterSchema,
  run: saveBulkLetter,
  revalidate: here,
})

export const sendBulkLetterAction = defineAction({
  name: 'sendBulkLetter',
  schema: sendBulkLetterSchema,
  run: sendBulkLetter,
  revalidate: here,
  limit: { points: 20, seconds: 3600 },
})

export const stopBulkLetterAction = defineAction({
  name: 'stopBulkLetter',
  schema: bulkStepSchema,
  run: stopBulkLetter,
  revalidate: here,
})
