import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { dirname, join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { overlongFiles } from '@/scripts/suite/fileLengths'
import { brokenLinks } from '@/scripts/suite/markdownLinks'

let root: string

function write(path: string, text: string): void {
  mkdirSync(dirname(join(root, path)), { recursive: true })
  writeFileSync(join(root, path), text)
}

beforeEach(() => {
  root = mkdtempSync(join(tmpdir(), 'documents-'))
  write('lib/paths.ts', 'export {}\n')
  write('README.md', '# Title\n\n## How it works\n')
  write('DEVELOPERS.md', '# For developers\n')
})
afterEach(() => rmSync(root, { recursive: true }))

// Seen to fail with anchors taken as always known, and with the length limit compared the wrong way round.
describe('links in the documents', () => {
  it('finds nothing wrong with links, anchors and paths that exist', () => {
    write('DEVELOPERS.md', 'See [why](README.md#how-it-works), `lib/paths.ts` and https://example.org.\n')
    expect(brokenLinks(root)).toEqual([])
  })

  it.each([
    ['[gone](lib/gone.ts)', 'DEVELOPERS.md links to lib/gone.ts, which does not exist.'],
    [
      '[there](README.md#nowhere)',
      'DEVELOPERS.md links to README.md#nowhere, but no heading there has that anchor.',
    ],
    ['![shot](public/shot.png)', 'DEVELOPERS.md links to public/shot.png, which does not exist.'],
    ['the file `lib/gone.ts`', 'DEVELOPERS.md names `lib/gone.ts`, which does not exist.'],
  ])('reports %s', (text, sentence) => {
    write('DEVELOPERS.md', `${text}\n`)
    expect(brokenLinks(root)).toEqual([sentence])
  })

  it('leaves blocks of code alone', () => {
    write('DEVELOPERS.md', '```sh\ncat `lib/gone.ts` [x](y)\n```\n')
    expect(brokenLinks(root)).toEqual([])
  })

  it('wants both documents, and the second one short', () => {
    rmSync(join(root, 'README.md'))
    write('DEVELOPERS.md', 'line\n'.repeat(310))
    expect(brokenLinks(root)).toEqual([
      'README.md is missing.',
      'DEVELOPERS.md has 311 lines; 300 are allowed.',
    ])
  })
})

describe('length of files', () => {
  it('names files over the limit and passes over tables of data', () => {
    write('lib/long.ts', 'x\n'.repeat(251))
    write('db/seeds/facilityData.ts', 'x\n'.repeat(900))
    expect(overlongFiles(root)).toEqual([
      'lib/long.ts has 251 lines; 250 are allowed. Split it by ideas.',
      'The median file has 251 lines; it is kept below 60.',
    ])
  })

  it('accepts files up to the limit', () => {
    write('lib/long.ts', 'x\n'.repeat(250))
    write('lib/short.ts', 'x\n')
    expect(overlongFiles(root)).toEqual([])
  })
})
