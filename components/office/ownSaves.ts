const saves = new Set<string>()
const key = (slug: string, version: number) => `${slug} ${version}`

/** Remembers that a form of this window made the call this version. */
export function noteOwnSave(slug: string, version: number): void {
  saves.add(key(slug, version))
}

/** How far the versions after this one are this window's own; a colleague's ends the chain. */
export function followOwnSaves(slug: string, version: number): number {
  let last = version
  while (saves.has(key(slug, last + 1))) last += 1
  return last
}
