'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { removePaper } from '@/lib/domain/papers/removePaper'
import { replacePaper } from '@/lib/domain/papers/replacePaper'
import { removePaperSchema, uploadPaperSchema } from '@/lib/domain/papers/schema'
import { uploadPaper } from '@/lib/domain/papers/uploadPaper'
import { paths } from '@/lib/paths'

const page = (_: unknown, { reference }: { reference: string }) => paths.proposalSection(reference, 'papers')

export const uploadPaperAction = defineAction({
  name: 'uploadPaper',
  schema: uploadPaperSchema,
  run: uploadPaper,
  revalidate: page,
  limit: { points: 20, seconds: 3600 },
})

export const replacePaperAction = defineAction({
  name: 'replacePaper',
  schema: uploadPaperSchema,
  run: replacePaper,
  revalidate: page,
  limit: { points: 20, seconds: 3600 },
})

export const removePaperAction = defineAction({
  name: 'removePaper',
  schema: removePaperSchema,
  run: removePaper,
  revalidate: page,
})
