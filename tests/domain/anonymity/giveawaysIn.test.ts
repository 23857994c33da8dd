import { describe, expect, it } from 'vitest'
import { giveawaysIn } from '@/lib/domain/anonymity/giveawaysIn'
import { ownWork } from '@/lib/domain/anonymity/ownWork'
import { placesWords } from '@/lib/domain/anonymity/placesWords'
import { sourcesOf } from '@/lib/domain/anonymity/sourcesOf'
import type { Source } from '@/lib/domain/anonymity/types'
import { defaultConstraints } from '@/lib/domain/observations/rules'
import { unwritten } from '@/lib/domain/proposals/unwritten'

const people = [
  { name: 'Ilse Márrowby', email: 'ilse@tarnhead.example', institute: 'Tarnhead University' },
  { name: 'Bo Li', email: 'bo@x.example', institute: 'MSA' },
]
const pages = (...texts: string[]): Source => ({
  name: 'document',
  parts: texts.map((text, index) => ({ at: index + 1, text })),
})
const found = (...sources: Source[]) =>
  giveawaysIn(sources, people).map((one) => `${one.kind} ${one.what}: ${placesWords(one)}`)

// Seen to fail: with parts of words counted, with accents kept, with lines searched one by one.
describe('by what investigators could be recognised', () => {
  it('are surnames, whatever case and accents, with every page once', () => {
    expect(found(pages('As MARROWBY et al. showed, Marrowby', 'nothing', 'Marrowby (2026)'))).toEqual([
      'name Ilse Márrowby: on pages 1 and 3 of the PDF',
    ])
  })

  it('are institutes, also over the end of a line, and short names whole', () => {
    const text: Source = {
      name: 'text',
      parts: [
        { at: 1, text: 'at Tarnhead' },
        { at: 2, text: 'University by Bo' },
        { at: 3, text: 'Li.' },
      ],
    }
    expect(found(text)).toEqual([
      'institute Tarnhead University: on line 1 of the text',
      'name Bo Li: on line 2 of the text',
    ])
  })

  it('are addresses and identifiers, whosever', () => {
    const text: Source = {
      name: 'text',
      parts: [
        { at: 1, text: 'write to ann.other@far.example' },
        { at: 2, text: 'see 0000-0002-1825-0097' },
      ],
    }
    expect(found(text)).toEqual([
      'address ann.other@far.example: on line 1 of the text',
      'orcid 0000-0002-1825-0097: on line 2 of the text',
    ])
  })

  it.each([
    ['Marrowbyan dust'],
    ['lithium and boron'],
    ['the MSA shutters'],
    ['our sample and our targets'],
    ['we find that'],
  ])('are not %j', (text) => {
    expect(found(pages(text))).toEqual([])
  })

  // Seen to fail: with the line end as the end of a phrase.
  it.each([
    ['as in our previous work', 'our previous work'],
    ['our own\nearlier survey found', 'our own earlier survey'],
    ['My team observed', 'My team'],
    ['we have recently shown that', 'we have recently shown'],
    ['As we showed in 2030', 'As we showed in'],
    ['data taken by our group', 'by our group'],
    ['see our Smith et al. (2030)', 'our Smith et al'],
  ])('are turns of phrase: %j', (text, words) => {
    expect(ownWork(text).map((turn) => turn.words)).toEqual([words])
  })

  it('name every source once', () => {
    expect(
      placesWords({
        places: [
          { source: 'title', at: null },
          { source: 'text', at: 3 },
          { source: 'text', at: 9 },
          { source: 'captions', at: 2 },
          { source: 'properties', at: null },
        ],
      }),
    ).toBe('in the title, on lines 3 and 9 of the text, under figure 2 and in the properties of the PDF')
  })
})

describe('what is looked through', () => {
  const contents = {
    title: 'A title',
    abstract: 'one\ntwo',
    constraintSets: [],
    writings: { ...unwritten, justification: { text: 'a\nb', version: 1 } },
    figures: [],
    papers: [],
  }
  // Seen to fail: with the written text looked through though a document is sent.
  it('is the text where it is sent, and not where a document is', () => {
    expect(sourcesOf(contents).map(({ name }) => name)).toEqual([
      'title',
      'abstract',
      'text',
      'captions',
      'references',
    ])
    const paper = {
      id: 1,
      kind: 'justification' as const,
      fileName: '',
      pages: 1,
      sizeBytes: 1,
      sha256: '',
      objectKey: '',
      uploadedAt: new Date(),
    }
    expect(sourcesOf({ ...contents, papers: [paper] }).map(({ name }) => name)).toEqual(['title', 'abstract'])
    const set = { ...defaultConstraints, id: 1, version: 1, cadence: 'every night, as Marrowby did' }
    expect(sourcesOf({ ...contents, constraintSets: [set] })[2]).toEqual({
      name: 'conditions',
      parts: [{ at: null, text: 'every night, as Marrowby did' }],
    })
    expect(sourcesOf(contents)[2]?.parts).toEqual([
      { at: 1, text: 'a' },
      { at: 2, text: 'b' },
    ])
  })
})
