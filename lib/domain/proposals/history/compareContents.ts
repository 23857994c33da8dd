import type { ProposalContents } from '../types'
import { thingKinds, thingsOf, type Thing, type ThingKind } from './thingsOf'

/** What became of one thing of a proposal from one version to another. */
export interface ThingChange {
  kind: ThingKind
  name: string
  what: 'new' | 'gone' | 'changed'
  /** The fields that differ; none for what is new or gone. */
  fields: { field: string; was: string; is: string }[]
}

function differing(was: Thing, is: Thing): ThingChange['fields'] {
  const names = [...new Set([...Object.keys(was.fields), ...Object.keys(is.fields)])]
  return names.flatMap((field) => {
    const [old, now] = [was.fields[field] ?? '', is.fields[field] ?? '']
    return old === now ? [] : [{ field, was: old, is: now }]
  })
}

/** Each thing beside what became of it: by its key, and by its name where it was taken out and put back. */
function compareThings(kind: ThingKind, before: readonly Thing[], after: readonly Thing[]): ThingChange[] {
  const left = new Set(before)
  const take = (is: (one: Thing) => boolean) => {
    const found = [...left].find(is)
    if (found) left.delete(found)
    return found
  }
  const byKey = after.map((now) => [now, take(({ id }) => id === now.id)] as const)
  const pairs = byKey.map(([now, was]) => [now, was ?? take(({ name }) => name === now.name)] as const)
  const changes = pairs.flatMap(([now, was]): ThingChange[] => {
    if (!was) return [{ kind, name: now.name, what: 'new', fields: [] }]
    const fields = differing(was, now)
    return fields.length > 0 ? [{ kind, name: now.name, what: 'changed', fields }] : []
  })
  return [...changes, ...[...left].map(({ name }): ThingChange => ({ kind, name, what: 'gone', fields: [] }))]
}

/** Field by field, how a proposal went on: what is new, what is gone, and what each changed field was and became. */
export function compareContents(before: ProposalContents, after: ProposalContents): ThingChange[] {
  const [old, now] = [thingsOf(before), thingsOf(after)]
  return thingKinds.flatMap((kind) => compareThings(kind, old[kind], now[kind]))
}
