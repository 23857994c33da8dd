import { describe, expect, it } from 'vitest'
import { affinityTable, type Knowledge } from '@/lib/panel/assignment/affinityTable'
import { wordsOfText } from '@/lib/panel/assignment/wordsOfText'

const knows = (levels: Record<string, number>, ...words: string[]): Knowledge => ({
  levels: new Map(Object.entries(levels)),
  words,
})

describe('words of a text', () => {
  it.each([
    ['Lyman-α emitters at z = 6', ' lyman α emitter at z 6 '],
    ['Galaxies, GALAXY; dwarfs', ' galaxy galaxy dwarf '],
    ['Class, gas, radius, mass', ' class gas radius mass '],
    ['Sérsic', ' sersic '],
    ['', '  '],
  ])('%s', (text, words) => expect(wordsOfText(text)).toBe(words))
})

describe('affinity', () => {
  const subjects = [
    { id: 1, category: 'Gas', text: 'Outflows and metals in haloes' },
    { id: 2, category: 'Lenses', text: 'A time delay. The metals are left aside' },
    { id: 3, category: 'Maps', text: 'Nothing of this' },
  ]

  // One word of three proposals weighs ln(4/2) + 1 = 1.6931, one of two ln(4/3) + 1 = 1.2877.
  const [rare, common] = [Math.log(2) + 1, Math.log(4 / 3) + 1]

  it('of a stated level alone is a quarter a step', () => {
    const of = affinityTable(
      subjects,
      new Map([0, 1, 2, 3].map((level) => [level, knows({ Gas: level, Maps: 3 - level })])),
    )
    expect([0, 1, 2, 3].map((level) => of(1, level))).toEqual([0, 0.25, 0.5, 0.75])
    expect([0, 1, 2, 3].map((level) => of(3, level))).toEqual([0.75, 0.5, 0.25, 0])
  })

  it('of words alone is their cosine, worked out by hand', () => {
    const of = affinityTable(
      subjects,
      new Map([
        [7, knows({}, 'outflow', 'metal')],
        [8, knows({}, 'Time delays', 'metals', 'outflows')],
        [9, knows({}, 'quasar')],
      ]),
    )
    // Proposal 1 holds both words and no other of the panel's; proposal 2 `metal` and `time delay`.
    expect(of(1, 7)).toBeCloseTo(1, 12)
    expect(of(2, 7)).toBeCloseTo(common ** 2 / (rare ** 2 + common ** 2), 12)
    expect(of(1, 8)).toBeCloseTo(Math.sqrt(rare ** 2 + common ** 2) / Math.hypot(rare, rare, common), 12)
    // The same from the numbers: 1.6931, 1.2877.
    expect(of(2, 7)).toBeCloseTo(0.36645, 4)
    expect(of(1, 8)).toBeCloseTo(0.7824, 4)
    expect([of(3, 7), of(1, 9)]).toEqual([0, 0])
  })

  it('joins level and words so that either only adds', () => {
    const both = affinityTable(
      subjects,
      new Map([
        [7, knows({ Lenses: 2 }, 'outflow', 'metal')],
        [8, knows({ Lenses: 2 })],
        [9, knows({}, 'outflow', 'metal')],
      ]),
    )
    const [joined, level, words] = [both(2, 7) ?? 0, both(2, 8) ?? 0, both(2, 9) ?? 0]
    expect(joined).toBeCloseTo(1 - (1 - level) * (1 - words), 12)
    expect(joined).toBeGreaterThan(Math.max(level, words))
    expect(both(1, 7)).toBeCloseTo(words === 0 ? 0 : 1, 12)
  })

  it('is null for who has said nothing, and for what is not asked about', () => {
    const of = affinityTable(subjects, new Map([[7, knows({ Gas: 3 })]]))
    expect([of(1, 8), of(99, 7)]).toEqual([null, null])
  })

  it('lies between 0 and 1, and does not depend on the order of anything', () => {
    const people = new Map([
      [7, knows({ Gas: 3, Maps: 1 }, 'outflow', 'halo', 'outflows')],
      [8, knows({ Lenses: 3 }, 'metal', 'time delay', 'halo')],
    ])
    const one = affinityTable(subjects, people)
    const other = affinityTable([...subjects].reverse(), new Map([...people].reverse()))
    for (const { id } of subjects)
      for (const reviewer of people.keys()) {
        const value = one(id, reviewer) ?? -1
        expect(value).toBeGreaterThanOrEqual(0)
        expect(value).toBeLessThanOrEqual(1)
        expect(other(id, reviewer)).toBeCloseTo(value, 12)
      }
  })
})
