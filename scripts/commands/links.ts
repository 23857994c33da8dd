import { brokenLinks } from '../suite/markdownLinks'

/** Broken links, anchors and paths in README.md and DEVELOPERS.md. */
export async function main(): Promise<number> {
  const broken = brokenLinks()
  for (const sentence of broken) console.log(sentence)
  if (broken.length === 0) console.log('All links and paths in README.md and DEVELOPERS.md lead somewhere.')
  return broken.length > 0 ? 1 : 0
}
