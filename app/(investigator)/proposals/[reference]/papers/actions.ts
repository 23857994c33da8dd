'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { removePaper } from '@/lib/domain/papers/removePaper'
import { removePaperSchema } from '@/lib/domain/papers/schema'
import { moveFigure } from '@/lib/domain/writings/moveFigure'
import { removeFigure } from '@/lib/domain/writings/removeFigure'
import { saveFigure } from '@/lib/domain/writings/saveFigure'
import { saveWriting } from '@/lib/domain/writings/saveWriting'
import {
  figureSchema,
  moveFigureSchema,
  saveFigureSchema,
  saveWritingSchema,
} from '@/lib/domain/writings/schema'
import { paths } from '@/lib/paths'

const page = (_: unknown, { reference }: { reference: string }) => paths.proposalSection(reference, 'papers')

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
