import { readFileSync } from 'node:fs'

/** Reads a table made by a script of tests/reference. Throws when it is missing: a lost row must fail. */
export function fixture<T>(name: string): T {
  const url = new URL(`../../reference/${name}.json`, import.meta.url)
  return JSON.parse(readFileSync(url, 'utf8')) as T
}
