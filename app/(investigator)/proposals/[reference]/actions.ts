'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { markSectionDone } from '@/lib/domain/proposals/markSectionDone'
import { putAwayDraft } from '@/lib/domain/proposals/putAwayDraft'
import { referenceSchema, sectionDoneSchema } from '@/lib/domain/proposals/schema'
import { takeBackDraft } from '@/lib/domain/proposals/takeBackDraft'
import { paths } from '@/lib/paths'

const everyPage = (_: unknown, { reference }: { reference: string }) => [
  paths.proposals(),
  paths.proposal(reference),
]

export const markSectionDoneAction = defineAction({
  name: 'markSectionDone',
  schema: sectionDoneSchema,
  run: markSectionDone,
  revalidate: everyPage,
})

export const putAwayDraftAction = defineAction({
  name: 'putAwayDraft',
  schema: referenceSchema,
  run: putAwayDraft,
  revalidate: everyPage,
})

export const takeBackDraftAction = defineAction({
  name: 'takeBackDraft',
  schema: referenceSchema,
  run: takeBackDraft,
  revalidate: everyPage,
})
