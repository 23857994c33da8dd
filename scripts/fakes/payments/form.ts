import { invalid } from './ApiError'

export type FormValue = string | FormTree | FormValue[]
export interface FormTree {
  [key: string]: FormValue
}

/** Reads `a[b][0][c]=d` into nested objects; keys 0, 1, 2 ... and `[]` become arrays. */
export function parseForm(text: string): FormTree {
  const root: FormTree = Object.create(null)
  for (const [name, value] of new URLSearchParams(text)) {
    const path = [...name.matchAll(/([^[\]]+)|\[\]/g)].map((match) => match[1] ?? '')
    if (path.some((key) => key === '__proto__' || key === 'constructor'))
      throw invalid('That name is not allowed.', name)
    insert(root, path, value)
  }
  return withArrays(root)
}

function insert(root: FormTree, path: readonly string[], value: string): void {
  let place = root
  path.forEach((key, index) => {
    const name = key === '' ? String(Object.keys(place).length) : key
    if (index === path.length - 1) {
      place[name] = value
      return
    }
    const next = place[name]
    const child: FormTree = isTree(next) ? next : Object.create(null)
    place[name] = child
    place = child
  })
}

function withArrays(tree: FormTree): FormTree {
  const result: FormTree = {}
  for (const [key, value] of Object.entries(tree)) {
    if (!isTree(value)) {
      result[key] = value
      continue
    }
    const inner = withArrays(value)
    const keys = Object.keys(inner)
    result[key] =
      keys.length > 0 && keys.every((name, index) => name === String(index)) ? Object.values(inner) : inner
  }
  return result
}

function isTree(value: FormValue | undefined): value is FormTree {
  return typeof value === 'object' && !Array.isArray(value)
}

export function textOf(tree: FormTree, name: string): string | null {
  const value = tree[name]
  if (value === undefined || value === '') return null
  if (typeof value !== 'string') throw invalid(`Invalid string: ${name}`, name)
  return value
}

export function treeOf(tree: FormTree, name: string): FormTree {
  const value = tree[name]
  if (value === undefined || value === '') return {}
  if (!isTree(value)) throw invalid(`Invalid object: ${name}`, name)
  return value
}

export function listOf(tree: FormTree, name: string): FormValue[] {
  const value = tree[name]
  if (value === undefined || value === '') return []
  if (!Array.isArray(value)) throw invalid(`Invalid array: ${name}`, name)
  return value
}

export function integerOf(tree: FormTree, name: string): number | null {
  const text = textOf(tree, name)
  if (text === null) return null
  if (!/^-?\d{1,12}$/.test(text)) throw invalid(`Invalid integer: ${text}`, name, 'parameter_invalid_integer')
  return Number(text)
}

/** Metadata is flat: at most 50 keys, keys to 40 and values to 500 characters. */
export function metadataOf(tree: FormTree): Record<string, string> {
  const result: Record<string, string> = {}
  for (const [key, value] of Object.entries(treeOf(tree, 'metadata'))) {
    if (typeof value !== 'string') throw invalid('Metadata values are strings.', `metadata[${key}]`)
    if (key.length > 40 || value.length > 500) {
      throw invalid('Metadata keys have at most 40 characters, values 500.', `metadata[${key}]`)
    }
    if (value !== '') result[key] = value
  }
  if (Object.keys(result).length > 50) throw invalid('Metadata has at most 50 keys.', 'metadata')
  return result
}
