import { invalid } from './ApiError'
import { integerOf, listOf, textOf, treeOf, type FormTree } from './form'

interface Listed {
  id: string
  created: number
}

/** Cuts one page out of a list that is oldest first; the API answers newest first. */
export function listPage<Item extends Listed>(items: readonly Item[], query: FormTree, url: string): unknown {
  const limit = integerOf(query, 'limit') ?? 10
  if (limit < 1 || limit > 100) throw invalid('limit is between 1 and 100.', 'limit')
  const newestFirst = [...items].reverse().filter(createdWithin(query))
  const after = textOf(query, 'starting_after')
  const before = textOf(query, 'ending_before')
  if (before !== null) {
    const end = positionOf(newestFirst, before, 'ending_before')
    return {
      object: 'list',
      data: newestFirst.slice(Math.max(0, end - limit), end),
      has_more: end > limit,
      url,
    }
  }
  const start = after === null ? 0 : positionOf(newestFirst, after, 'starting_after') + 1
  const data = newestFirst.slice(start, start + limit)
  return { object: 'list', data, has_more: start + limit < newestFirst.length, url }
}

function positionOf(items: readonly Listed[], id: string, param: string): number {
  const index = items.findIndex((item) => item.id === id)
  if (index < 0) throw invalid(`No such object: '${id}'`, param, 'resource_missing')
  return index
}

function createdWithin(query: FormTree): (item: Listed) => boolean {
  if (query.created === undefined) return () => true
  if (typeof query.created === 'string') {
    const exactly = integerOf(query, 'created')
    return (item) => item.created === exactly
  }
  const range = treeOf(query, 'created')
  const gte = integerOf(range, 'gte') ?? (integerOf(range, 'gt') ?? -1) + 1
  const lte = integerOf(range, 'lte') ?? (integerOf(range, 'lt') ?? Number.MAX_SAFE_INTEGER) - 1
  const top = integerOf(range, 'lte') ?? lte
  return (item) => item.created >= gte && item.created <= top
}

/** `type=a` or `types[]=a&types[]=b`, where `charge.*` stands for all of its kind. */
export function typeFilter(query: FormTree): (type: string) => boolean {
  const single = textOf(query, 'type')
  const wanted = single === null ? listOf(query, 'types').map(String) : [single]
  if (wanted.length === 0) return () => true
  return (type) =>
    wanted.some((name) => (name.endsWith('.*') ? type.startsWith(name.slice(0, -1)) : type === name))
}
