import { existsSync, readFileSync } from 'node:fs'
import { dirname, join, relative } from 'node:path'
import { projectRoot } from '../services/folders'

const documents = ['README.md', 'DEVELOPERS.md']
const longest: Record<string, number> = { 'DEVELOPERS.md': 300 }
// A bare name such as `rules.ts` stands for many files; a path with a folder means one.
const repositoryPath = /^(app|components|db|lib|pdf|public|scripts|tests|types|\.ci)\/[\w./()[\]@-]+$/

/** Every broken link, anchor and path in the two documents, as sentences. */
export function brokenLinks(root = projectRoot): string[] {
  return documents.flatMap((name) => {
    const file = join(root, name)
    if (!existsSync(file)) return [`${name} is missing.`]
    const text = readFileSync(file, 'utf8')
    const prose = withoutFences(text)
    const lines = text.split('\n').length
    const limit = longest[name]
    return [
      ...(limit !== undefined && lines > limit ? [`${name} has ${lines} lines; ${limit} are allowed.`] : []),
      ...linkTargets(prose).flatMap((target) => checkTarget(root, file, target)),
      ...pathsInCode(prose)
        .filter((path) => !existsSync(join(root, path)))
        .map((path) => `${name} names \`${path}\`, which does not exist.`),
    ]
  })
}

function withoutFences(text: string): string {
  return text.replace(/^```[\s\S]*?^```/gm, '')
}

function linkTargets(text: string): string[] {
  const targets = [...text.matchAll(/!?\[[^\]]*\]\(\s*<?([^)\s>]+)>?[^)]*\)/g)].map((match) => match[1] ?? '')
  const inHtml = [...text.matchAll(/(?:src|href)="([^"]+)"/g)].map((match) => match[1] ?? '')
  return [...targets, ...inHtml]
}

function pathsInCode(text: string): string[] {
  return [...text.matchAll(/`([^`\n]+)`/g)]
    .map((match) => match[1] ?? '')
    .filter((code) => repositoryPath.test(code) && !/[*<>]|\[\w+\]$/.test(code))
}

function checkTarget(root: string, file: string, target: string): string[] {
  // Other sites are not asked: the tests must pass without a network.
  if (/^[a-z]+:/.test(target)) return []
  const [path = '', anchor] = target.split('#')
  const full = path === '' ? file : join(dirname(file), decodeURIComponent(path))
  const name = relative(root, file)
  if (!existsSync(full)) return [`${name} links to ${target}, which does not exist.`]
  if (anchor === undefined || !full.endsWith('.md')) return []
  const known = anchorsOf(readFileSync(full, 'utf8'))
  return known.has(anchor) ? [] : [`${name} links to ${target}, but no heading there has that anchor.`]
}

/** Anchors as code hosts derive them from headings. */
function anchorsOf(text: string): Set<string> {
  const headings = [...withoutFences(text).matchAll(/^#{1,6}\s+(.+)$/gm)].map((match) => match[1] ?? '')
  return new Set(
    headings.map((heading) =>
      heading
        .toLowerCase()
        .replace(/[^\p{Letter}\p{Number}\s_-]/gu, '')
        .trim()
        .replace(/\s/g, '-'),
    ),
  )
}
