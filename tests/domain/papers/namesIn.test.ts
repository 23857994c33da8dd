import { describe, expect, it } from 'vitest'
import { namesIn } from '@/lib/domain/papers/namesIn'

const people = [
  { name: 'Ilse Márrowby', email: 'ilse@tarnhead.example', institute: 'Tarnhead University' },
  { name: 'Bo Li', email: 'bo@x.example', institute: 'MSA' },
]
const found = (pages: string[], properties: string[] = []) => namesIn({ pages, properties }, people)

// Seen to fail: with parts of words counted, and with accents kept.
describe('names in a document read without names', () => {
  it('are found by surname, whatever case and accents, with their pages', () => {
    expect(found(['As MARROWBY et al. showed', 'nothing', 'Marrowby (2026)'])).toEqual([
      { name: 'Ilse Márrowby', pages: [1, 3], inProperties: false },
    ])
  })

  it('are found in addresses, institutes and properties', () => {
    expect(found(['write to ilse@tarnhead.example', 'at Tarnhead  University'], ['Bo Li'])).toEqual([
      { name: 'ilse@tarnhead.example', pages: [1], inProperties: false },
      { name: 'Tarnhead University', pages: [2], inProperties: false },
      { name: 'Bo Li', pages: [], inProperties: true },
    ])
  })

  it.each([['Marrowbyan dust'], ['lithium and boron'], ['the MSA shutters']])(
    'are not found in %j',
    (text) => {
      expect(found([text])).toEqual([])
    },
  )
})
