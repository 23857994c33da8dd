import { describe, expect, it } from 'vitest'
import { access } from '@/lib/auth/access'

// Seen to fail: a page without openPage, a handler made by hand, and an action left out of the matrix were each tried.

const sources: Record<string, string> = Object.fromEntries(
  Object.entries(
    import.meta.glob<string>(['/app/**/*.{ts,tsx}', '/components/**/*.{ts,tsx}', '/lib/**/*.ts'], {
      query: '?raw',
      import: 'default',
      eager: true,
    }),
  ).map(([path, source]) => [path.slice(1), source]),
)
const files = (shape: RegExp) =>
  Object.keys(sources)
    .filter((file) => shape.test(file))
    .sort()
const read = (file: string) => sources[file] ?? ''
const withoutGroups = (path: string) =>
  path
    .replace(/^app/, '')
    .replace(/\/\([^)]+\)/g, '')
    .replace(/\/(page\.tsx|route\.ts)$/, '') || '/'

const pages = files(/^app\/.*page\.tsx$/).map((file) => ({ file, path: withoutGroups(file) }))
const routes = files(/^app\/.*\/route\.ts$/)
  .filter((file) => !file.includes('nextauth'))
  .flatMap((file) =>
    [...read(file).matchAll(/export const (GET|POST|PUT|PATCH|DELETE)\b/g)].map((match) => ({
      file,
      name: `${match[1]} ${withoutGroups(file)}`,
    })),
  )
const actions = files(/^app\/.*\/actions\.ts$/).map((file) => ({ file, source: read(file) }))

describe('the access matrix', () => {
  it('finds pages, handlers and actions to look at', () => {
    expect(pages.length).toBeGreaterThan(30)
    expect(routes.length).toBeGreaterThan(10)
    expect(actions.length).toBeGreaterThan(10)
  })

  it.each(pages)('lists the page $path, and the page opens by its own row', ({ file, path }) => {
    expect(Object.keys(access.pages)).toContain(path)
    expect(read(file)).toContain(`openPage('${path}')`)
  })

  it.each(routes)('lists the handler $name, made by defineRoute', ({ file, name }) => {
    expect(Object.keys(access.routes)).toContain(name)
    const source = read(file)
    expect(source).toContain(`name: '${name}'`)
    const exported = [...source.matchAll(/export const (?:GET|POST|PUT|PATCH|DELETE)\b[^=]*= (\w+)/g)]
    expect(exported.every((match) => match[1] === 'defineRoute')).toBe(true)
  })

  it.each(actions)('$file exports nothing but actions of the matrix', ({ source }) => {
    expect(source).toMatch(/^'use server'/)
    const exported = [...source.matchAll(/^export const \w+ = (\w+)/gm)]
    expect(exported.length).toBeGreaterThan(0)
    expect(exported.every((match) => match[1] === 'defineAction')).toBe(true)
    expect(source).not.toMatch(/^export (async )?function|^export default/m)
    for (const match of source.matchAll(/name: '(\w+)'/g))
      expect(Object.keys(access.actions)).toContain(match[1])
    expect([...source.matchAll(/name: '(\w+)'/g)].length).toBeGreaterThanOrEqual(exported.length)
  })

  it('has no row that leads nowhere', () => {
    const built = new Set(pages.map(({ path }) => path))
    expect(Object.keys(access.pages).filter((path) => !built.has(path))).toEqual([])
    const handled = new Set(routes.map(({ name }) => name))
    expect(Object.keys(access.routes).filter((name) => !handled.has(name))).toEqual([])
    const named = new Set(
      actions.flatMap(({ source }) => [...source.matchAll(/name: '(\w+)'/g)].map((m) => m[1])),
    )
    expect(Object.keys(access.actions).filter((name) => !named.has(name))).toEqual([])
  })

  it('keeps every "use server" in an actions file', () => {
    const elsewhere = files(/./).filter(
      (file) => !file.endsWith('/actions.ts') && /^['"]use server['"]/m.test(read(file)),
    )
    expect(elsewhere).toEqual([])
  })
})
