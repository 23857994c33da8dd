'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { removeKind } from '@/lib/domain/calls/removeKind'
import { removePanel } from '@/lib/domain/calls/removePanel'
import {
  removeKindSchema,
  removePanelSchema,
  saveCriteriaSchema,
  saveKindSchema,
  savePanelSchema,
} from '@/lib/domain/calls/rulesSchema'
import { saveCriteria } from '@/lib/domain/calls/saveCriteria'
import { saveKind } from '@/lib/domain/calls/saveKind'
import { savePanel } from '@/lib/domain/calls/savePanel'
import { paths } from '@/lib/paths'

const pages = (_: unknown, { slug }: { slug: string }) => [
  paths.officeCallPage(slug, 'rules'),
  paths.call(slug),
]

export const saveKindAction = defineAction({
  name: 'saveKind',
  schema: saveKindSchema,
  run: saveKind,
  revalidate: pages,
})

export const removeKindAction = defineAction({
  name: 'removeKind',
  schema: removeKindSchema,
  run: removeKind,
  revalidate: pages,
})

export const savePanelAction = defineAction({
  name: 'savePanel',
  schema: savePanelSchema,
  run: savePanel,
  revalidate: pages,
})

export const removePanelAction = defineAction({
  name: 'removePanel',
  schema: removePanelSchema,
  run: removePanel,
  revalidate: pages,
})

export const saveCriteriaAction = defineAction({
  name: 'saveCriteria',
  schema: saveCriteriaSchema,
  run: saveCriteria,
  revalidate: pages,
})
