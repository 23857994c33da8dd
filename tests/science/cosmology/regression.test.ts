import { describe, expect, it } from 'vitest'
import { cosmologyPresets, expansionHistory, presetCosmology } from '../../../lib/science/cosmology'
import { universe } from '../support/models'

describe('regression', () => {
  // Sentences people read; the numbers in them are checked against other sources elsewhere.
  it.each([
    [
      'planck-2018',
      'Flat. It began in a big bang 13.79 Gyr ago, has been speeding up since z = 0.64 (6.1 Gyr ago) and expands forever.',
    ],
    [
      'einstein-de-sitter',
      'Flat. It began in a big bang 9.31 Gyr ago, slows for all time, and never quite stops.',
    ],
    ['open-30', 'Open. It began in a big bang 11.30 Gyr ago, slows for all time, and never stops.'],
  ])('%s in words', (id, sentence) => {
    expect(presetCosmology(id).universe.sentence).toBe(sentence)
  })

  it('a bounce, a crunch, a rip and a loiterer in words', () => {
    expect(universe({ Ode0: 1.75 }).universe.sentence).toBe(
      'Closed, and without a big bang: it shrank, turned 18.4 Gyr ago at z = 0.92, and has grown since. No larger redshift exists.',
    )
    expect(universe({ Om0: 2, Ode0: 0 }).universe.sentence).toBe(
      'Closed. It began in a big bang 7.97 Gyr ago, slows and falls back together, 87.8 Gyr after it began.',
    )
    expect(universe({ Ode0: 'flat', w0: -1.5 }).universe.sentence).toContain('and tears apart in 21.7 Gyr.')
    expect(universe({ Ode0: 1.7 }).universe.loitering).toBe(true)
    expect(universe({ Om0: 0.3, Ode0: 0.7 }).universe.shape).toBe('flat')
  })

  it('the eight presets keep their ids', () => {
    expect(cosmologyPresets.map(({ id }) => id)).toEqual([
      'planck-2018',
      'planck-2015',
      'wmap-9',
      'flat-70-30',
      'einstein-de-sitter',
      'open-30',
      'local-ladder',
      'evolving-dark-energy',
    ])
    expect(() => presetCosmology('planck-2099')).toThrow('No cosmology is called “planck-2099”.')
  })

  it('size against time: one branch, or both sides of a turn', () => {
    const grow = expansionHistory(presetCosmology('planck-2018'), 0.01, 3, 50)
    expect(grow).toHaveLength(50)
    expect(grow.every((m, i) => i === 0 || m.gyrFromNow > (grow[i - 1]?.gyrFromNow ?? Infinity))).toBe(true)
    const bounce = expansionHistory(universe({ Ode0: 1.75 }), 0.1, 1.5, 20)
    expect(bounce).toHaveLength(39)
    expect(Math.min(...bounce.map((m) => m.scaleFactor))).toBeCloseTo(1 / 1.92372, 4)
    const crunch = expansionHistory(universe({ Om0: 2, Ode0: 0 }), 0.01, 5, 20)
    expect(Math.max(...crunch.map((m) => m.scaleFactor))).toBeCloseTo(2, 9)
    expect(crunch.at(-1)?.scaleFactor).toBeCloseTo(0.01, 9)
  })

  it('a batch gives the same numbers as one at a time, into the array given', () => {
    const cosmology = presetCosmology('planck-2018')
    const redshifts = Float64Array.from([0, 5, 0.1, 1100, 0.1])
    const out = new Float64Array(5)
    expect(cosmology.batch('luminosityMpc', redshifts, out)).toBe(out)
    expect([...out]).toEqual([...redshifts].map((z) => cosmology.luminosityMpc(z)))
  })
})
