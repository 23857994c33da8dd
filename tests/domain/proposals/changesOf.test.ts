import { describe, expect, it } from 'vitest'
import type { SubjectEntry } from '@/db/queries/logbook'
import { changesOf } from '@/lib/domain/proposals/history/changesOf'

const entry = (minute: number, over: Partial<SubjectEntry>): SubjectEntry => ({
  at: new Date(Date.UTC(2027, 2, 18, 2, minute)),
  personId: 1,
  name: 'Ilse Marrowby',
  actingAs: 'investigator',
  action: 'proposal.question',
  before: null,
  after: null,
  ...over,
})
const names = {
  target: (id: number) => (id === 11 ? '3C 273' : null),
  observation: (id: number) => (id === 21 ? '3C 273' : null),
}
const read = (entries: SubjectEntry[]) =>
  changesOf(entries, 1, names).map(({ who, words }) => `${who}: ${words}`)

// Seen to fail: without the merging of spells, and with people of the panel let through by name.
describe('the history as an investigator reads it', () => {
  it('draws long typing together, from where it began to where it ended', () => {
    expect(
      read([
        entry(9, { before: { title: 'Ab' }, after: { title: 'Abc' } }),
        entry(5, { before: { abstract: '' }, after: { abstract: 'words' } }),
        entry(1, { before: { title: '' }, after: { title: 'Ab' } }),
      ]),
    ).toEqual(['you: Title: “Abc”; Abstract: 0 to 5 characters'])
  })

  it('keeps two people, and two spells, apart', () => {
    const change = { before: { category: '' }, after: { category: 'Surveys and maps' } }
    expect(
      read([
        entry(40, change),
        entry(20, { ...change, personId: 2, name: 'Tomas Quenhart' }),
        entry(1, change),
      ]),
    ).toEqual([
      'you: Category: Surveys and maps',
      'Tomas Quenhart: Category: Surveys and maps',
      'you: Category: Surveys and maps',
    ])
  })

  it('says nothing of what was changed and changed back', () => {
    expect(
      read([
        entry(3, { before: { title: 'B' }, after: { title: 'A' } }),
        entry(1, { before: { title: 'A' }, after: { title: 'B' } }),
      ]),
    ).toEqual([])
  })

  it.each([
    ['office', 'the office: Waived the fee'],
    ['clock', 'the clock: Waived the fee'],
    ['chair', null],
    ['reviewer', null],
  ])('an act of the %s', (actingAs, expected) => {
    const lines = read([entry(1, { actingAs, action: 'fee.decide-waiver', after: { decision: 'granted' } })])
    expect(lines).toEqual(expected ? [expected] : [])
  })

  it('leaves out what it has no words for', () => {
    expect(read([entry(1, { action: 'score.save', after: { halfPoints: 15 } })])).toEqual([])
  })

  it.each<[string, Partial<SubjectEntry>, string]>([
    [
      'asked time',
      {
        action: 'observation.ask',
        before: { asked: [{ askedSeconds: 9360 }] },
        after: { asked: [{ askedSeconds: 9000 }] },
      },
      'Asked hours: 2.6\u00a0h to 2.5\u00a0h',
    ],
    [
      'a new paper',
      {
        action: 'papers.add',
        before: { fileName: 'quads-v4.pdf' },
        after: { kind: 'justification', fileName: 'quads-v5.pdf' },
      },
      'Papers: quads-v5.pdf in place of quads-v4.pdf',
    ],
    ['a target', { action: 'target.add', after: { target: { name: 'HE 2149−2745' } } }, 'Added HE 2149−2745'],
    [
      'a cosmology',
      {
        action: 'proposal.cosmology',
        before: { cosmology_parameters: '{"name":"WMAP 9"}' },
        after: { cosmology_parameters: '{"name":"Planck 2018"}' },
      },
      'Chose Planck 2018 in place of WMAP 9',
    ],
    [
      'a section',
      {
        action: 'proposal.section',
        before: { sections_done: '[]' },
        after: { sections_done: '["targets"]' },
      },
      'Marked targets as done',
    ],
    [
      'an observation',
      { action: 'observation.add', after: { observation: { targetId: 11 } } },
      'Added an observation of 3C 273',
    ],
    [
      'time asked of one',
      {
        action: 'observation.ask',
        before: { asked: [{ id: 21, askedSeconds: 3600 }] },
        after: { asked: [{ id: 21, askedSeconds: 7200 }] },
      },
      'Asked hours for 3C 273: 1.0\u00a0h to 2.0\u00a0h',
    ],
    ['values that are not there', { action: 'people.add', after: null }, 'Named somebody, who may read it'],
  ])('words %s', (_, over, words) => {
    expect(read([entry(1, over)])).toEqual([`you: ${words}`])
  })
})
