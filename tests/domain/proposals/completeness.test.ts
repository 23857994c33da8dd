import { describe, expect, it } from 'vitest'
import type { ProposalComputation, Verdict } from '@/lib/domain/observations/types'
import { completeness, everythingMissing } from '@/lib/domain/proposals/completeness'
import type { ProposalContents } from '@/lib/domain/proposals/types'
import type { WritingPart } from '@/lib/domain/proposals/writingTypes'
import { unwritten } from '@/lib/domain/proposals/unwritten'
import { maxTeamWords } from '@/lib/domain/writings/limits'
import { contents, observation, target } from '../../support/contents'
import { investigator } from '../../support/proposalSubject'

const paper = {
  id: 1,
  kind: 'justification' as const,
  fileName: 'quads-v5.pdf',
  pages: 3,
  sizeBytes: 1000,
  sha256: 'a',
  objectKey: 'aa/b',
  uploadedAt: new Date(0),
}

const written = (part: WritingPart, text: string) => ({ ...unwritten, [part]: { text, version: 1 } })

const full = (over: Partial<ProposalContents> = {}): ProposalContents =>
  contents({
    title: 'Weighing black holes',
    abstract: 'What is asked.',
    category: 'Gravitational lenses',
    targets: [target()],
    observations: [observation()],
    papers: [paper],
    people: [investigator(1, { role: 'pi' }), investigator(2)],
    ...over,
  })

const computed = (
  verdict: Verdict = 'feasible',
  over: { refusal?: string | null; targetRefusal?: string | null; askedSeconds?: number } = {},
): ProposalComputation => ({
  engineVersion: '1',
  cosmologyName: 'Planck 2018',
  recordVersions: {},
  targets: [
    {
      targetId: 11,
      luminosityMpc: 780,
      angularDiameterMpc: 580,
      comovingMpc: 670,
      kpcPerArcsec: 2.8,
      distanceModulusMag: 39.4,
      lookbackGyr: 2,
      ageGyr: 11.8,
      visibleHours: 300,
      visibleHoursByMonth: [],
      visibleHoursByNight: [],
      refusal: over.targetRefusal ?? null,
      comparison: null,
    },
  ],
  observations: [
    {
      observationId: 21,
      targetId: 11,
      neededSeconds: 3600,
      openShutterSeconds: 3000,
      overheadSeconds: 600,
      subExposures: 2,
      subExposureSeconds: 1500,
      snrReached: 20,
      regime: null,
      observedFeatureA: 7604,
      usableHours: 300,
      exposure: null,
      checks: [
        {
          id: 'band',
          name: 'In a clear window',
          measured: '',
          feasibleTo: '',
          failsAt: '',
          verdict,
          why: 'the line falls in a water band.',
          fix: null,
        },
      ],
      verdict,
      refusal: over.refusal ?? null,
      times: 1,
    },
  ],
  groups: [],
  askedSeconds: over.askedSeconds ?? 3600,
  neededSeconds: 3600,
  askedNights: 0.1,
  checksClear: verdict === 'feasible' ? 1 : 0,
  checksTotal: 1,
  verdict,
})

const report = (given: ProposalContents, computation = computed()) =>
  Object.fromEntries(completeness(given, computation).map((section) => [section.section, section]))
const missing = (given: ProposalContents, computation = computed()) =>
  everythingMissing(completeness(given, computation)).map(({ sentence }) => sentence)

// Seen to fail: each row of the table, with its rule taken out.
describe('what bars a proposal from being sent', () => {
  const base = contents()
  it.each<[string, Partial<ProposalContents>, ProposalComputation, string[]]>([
    ['nothing, when all is there', {}, computed(), []],
    ['no title', { title: '' }, computed(), ['Give the proposal a title.']],
    ['an abstract of blanks', { abstract: '  \n ' }, computed(), ['Write the abstract.']],
    ['no category', { category: '' }, computed(), ['Choose a category.']],
    [
      'an abstract two characters too long',
      { abstract: 'é'.repeat(base.kind.abstractLimit + 2) },
      computed(),
      ['Shorten the abstract by two characters.'],
    ],
    [
      'a text of too many words',
      { papers: [], writings: written('justification', 'word '.repeat(base.kind.wordLimit + 2)) },
      computed(),
      ['Shorten the justification by two words.'],
    ],
    [
      'a text of too many words under a document',
      { writings: written('justification', 'word '.repeat(base.kind.wordLimit + 2)) },
      computed(),
      [],
    ],
    [
      'a text without a word',
      { papers: [], writings: written('justification', '\n\n---\n') },
      computed(),
      ['Write the justification, or add it as a PDF.'],
    ],
    ['a text', { papers: [], writings: written('justification', 'It is $x$.') }, computed(), []],
    [
      'too many words on the team',
      { writings: written('team', 'word '.repeat(maxTeamWords + 1)) },
      computed(),
      ['Shorten the words on the team by one word.'],
    ],
    ['no paper', { papers: [] }, computed(), ['Write the justification, or add it as a PDF.']],
    [
      'only the page on the team',
      { papers: [{ ...paper, kind: 'team-expertise' }] },
      computed(),
      ['Write the justification, or add it as a PDF.'],
    ],
    [
      'a paper too long for its kind',
      { papers: [{ ...paper, pages: base.kind.pageLimit + 1 }] },
      computed(),
      [
        `Shorten the justification to ${base.kind.pageLimit === 4 ? 'four pages' : `${base.kind.pageLimit} pages`}.`,
      ],
    ],
    [
      'no target, and so nothing observed',
      { targets: [], observations: [] },
      computed(),
      ['Add a target.', 'Say what is to be observed.'],
    ],
    [
      'a target without a position',
      { targets: [target({ raDeg: null })] },
      computed(),
      ['Give the position of 3C 273.'],
    ],
    [
      'a redshift this universe does not have',
      {},
      computed('feasible', { targetRefusal: 'No such redshift.' }),
      ['3C 273: No such redshift.'],
    ],
    [
      'a required target nobody observes',
      { targets: [target(), target({ id: 12, name: 'PDS 456' })] },
      computed(),
      ['PDS 456 is required, but nothing observes it.'],
    ],
    [
      'an optional target nobody observes',
      { targets: [target(), target({ id: 12, need: 'optional' })] },
      computed(),
      [],
    ],
    [
      'an observation of no time',
      { observations: [observation({ askedSeconds: 0 })] },
      computed(),
      ['Ask for time on 3C 273.'],
    ],
    [
      'an observation that cannot be computed',
      {},
      computed('feasible', { refusal: 'Give a magnitude.' }),
      ['3C 273: Give a magnitude.'],
    ],
    [
      'more time than the kind allows',
      { kind: { ...base.kind, maxSeconds: 7200 } },
      computed('feasible', { askedSeconds: 7201 }),
      [expect.stringContaining('this kind of proposal may ask for 2.0') as string],
    ],
    [
      'exactly the time the kind allows',
      { kind: { ...base.kind, maxSeconds: 7200 } },
      computed('feasible', { askedSeconds: 7200 }),
      [],
    ],
    [
      'more targets than the kind takes',
      {
        kind: { ...base.kind, targetLimit: 1 },
        targets: [target(), target({ id: 12, name: 'Second', need: 'optional' })],
      },
      computed(),
      ['Two targets are named; this kind of proposal may name one.'],
    ],
    [
      'conditions that do not say how often, of a kind that asks it',
      { kind: { ...base.kind, needsCadence: true } },
      computed(),
      ['Conditions: say how often it is repeated.'],
    ],
    [
      'conditions that say neither how often nor by when',
      { kind: { ...base.kind, needsCadence: true, needsLastNight: true } },
      computed(),
      [
        'Conditions: say how often it is repeated.',
        'Conditions: say by when it is needed, as the last evening.',
      ],
    ],
    [
      'conditions that say both, beside some that nothing uses',
      {
        kind: { ...base.kind, needsCadence: true, needsLastNight: true },
        constraintSets: base.constraintSets.flatMap((set) => [
          { ...set, cadence: 'every 4 nights', dateTo: '2027-09-01' },
          { ...set, id: 99, name: 'Unused' },
        ]),
      },
      computed(),
      [],
    ],
    ['a verdict of marginal', {}, computed('marginal'), []],
    [
      'a verdict of not feasible, unanswered',
      {},
      computed('not-feasible'),
      ['3C 273: the line falls in a water band.'],
    ],
    ['a verdict of not feasible, answered', { sectionsDone: ['feasibility'] }, computed('not-feasible'), []],
    [
      'someone who has yet to agree',
      { people: [investigator(1, { role: 'pi' }), investigator(2, { confirmedAt: null })] },
      computed(),
      [],
    ],
  ])('%s', (_, over, computation, expected) => {
    expect(missing(full(over), computation)).toEqual(expected)
  })
})

describe('how far a section is', () => {
  it('begins as what needs the author, with what waits for it', () => {
    const { question, papers, targets, cosmology, observing, feasibility, people, send } = report(
      contents({
        title: 'Begun',
        targets: [],
        observations: [],
        papers: [],
        people: [investigator(1, { role: 'pi' })],
      }),
      { ...computed(), targets: [], observations: [] },
    )
    expect([question, papers, targets, cosmology, observing, people].map((one) => one?.state)).toEqual([
      'needs-you',
      'needs-you',
      'needs-you',
      'begun',
      'needs-you',
      'begun',
    ])
    expect(feasibility).toMatchObject({ state: 'waits', waitsFor: 'observing' })
    expect(send).toMatchObject({ state: 'waits', waitsFor: 'question' })
  })

  it('is begun when complete, done when the author says so', () => {
    expect(report(full()).question?.state).toBe('begun')
    expect(report(full({ sectionsDone: ['question'] })).question?.state).toBe('done')
  })

  it('needs the author again when it was called done and something went missing', () => {
    expect(report(full({ sectionsDone: ['question'], category: '' })).question?.state).toBe('needs-you')
  })

  it('settles by itself where there is nothing to say', () => {
    const { feasibility, people } = report(full())
    expect([feasibility?.state, people?.state]).toEqual(['done', 'done'])
  })

  it('opens sending when nothing is missing, and closes it when sent', () => {
    expect(report(full()).send).toMatchObject({ state: 'begun', waitsFor: null })
    expect(report(full({ state: 'submitted' })).send).toMatchObject({ state: 'done', detail: 'Sent' })
    expect(report(full({ state: 'submitted', isReopened: true })).send?.detail).toContain('Reopened')
  })

  it('says in a few words what stands there', () => {
    const { question, papers, targets, people } = report(full())
    expect(question?.detail).toBe('Title, abstract of 14 characters, category')
    expect(papers?.detail).toMatch(/^quads-v5\.pdf, 3 of /)
    expect(targets?.detail).toBe('One target, z 0.158')
    expect(people?.detail).toBe('Person 1 and one co-investigator')
  })

  it('points each missing thing to the place where it is mended', () => {
    const [first] = everythingMissing(completeness(full({ targets: [target({ raDeg: null })] }), computed()))
    expect(first).toMatchObject({ href: '/proposals/4F7-K2M/targets#target-11', field: 'target-11' })
  })
})
