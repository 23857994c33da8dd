'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { removePaper } from '@/lib/domain/papers/removePaper'
import { replacePaper } from '@/lib/domain/papers/replacePaper'
import { removePaperSchema, uploadPaperSchema } from '@/lib/domain/papers/schema'
import { uploadPaper } from '@/lib/domain/papers/uploadPaper'
import { moveFigure } from '@/lib/domain/writings/moveFigure'
import { removeFigure } from '@/lib/domain/writings/removeFigure'
import { saveFigure } from '@/lib/domain/writings/saveFigure'
import { saveWriting } from '@/lib/domain/writings/saveWriting'
import {
  figureSchema,
  moveFigureSchema,
  saveFigureSchema,
  saveWritingSchema,
  uploadFigureSchema,
} from '@/lib/domain/writings/schema'
import { uploadFigure } from '@/lib/domain/writings/uploadFigure'
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

export const saveWritingAction = defineAction({
  name: 'saveWriting',
  schema: saveWritingSchema,
  run: saveWriting,
  revalidate: page,
  limit: { points: 90, seconds: 60 },
})

export const uploadFigureAction = defineAction({
  name: 'uploadFigure',
  schema: uploadFigureSchema,
  run: uploadFigure,
  revalidate: page,
  limit: { points: 60, seconds: 3600 },
})

export const saveFigureAction = defineAction({
  name: 'saveFigure',
  schema: saveFigureSchema,
  run: saveFigure,
  revalidate: page,
  limit: { points: 90, seconds: 60 },
})

export const moveFigureAction = defineAction({
  name: 'moveFigure',
  schema: moveFigureSchema,
  run: moveFigure,
  revalidate: page,
})

export const removeFigureAction = defineAction({
  name: 'removeFigure',
  schema: figureSchema,
  run: removeFigure,
  revalidate: page,
})
