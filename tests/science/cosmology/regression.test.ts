import { describe, expect, it } from 'vitest'
import {
  cosmologyPresets,
  expansionHistory,
  presetCosmology,
  cosmologyQuantities,
} from '../../../lib/science/cosmology'
import { ScienceError } from '../../../lib/science/ScienceError'
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

  const models = {
    'flat, massive neutrinos': presetCosmology('planck-2018'),
    open: presetCosmology('open-30'),
    closed: universe({ Om0: 0.3, Ode0: 0.9, Tcmb0: 2.7255, Neff: 3.046 }),
    bounce: universe({ Om0: 0.3, Ode0: 1.75 }),
    loitering: universe({ Ode0: 1.7 }),
    'steep dark energy': universe({ Ode0: 'flat', w0: -20, wa: 15 }),
    recollapsing: universe({ Om0: 2, Ode0: -0.5 }),
  }
  it.each(Object.entries(models))(
    '%s: a batch gives the same numbers as one at a time, bit for bit',
    (_, c) => {
      expect.assertions(4 * (c.universe.origin === 'bounce' ? 20 : 21))
      const farthest = c.antipodeRedshift ?? Math.min(c.deepestRedshift, 3000)
      // To the very end, over the ends of pieces, out of order.
      const redshifts = Float64Array.from([
        1, 0.3, 1e-9, 5e-4, 0.0625, 0.06249999999999999, 0.999, 0.5, 0.01, 0.7,
      ]).map((share) => share * farthest * (1 - 1e-9))
      for (const quantity of cosmologyQuantities) {
        if (quantity === 'ageGyr' && c.universe.origin === 'bounce') continue
        const out = new Float64Array(redshifts.length)
        expect(c.batch(quantity, redshifts, out)).toBe(out)
        expect({ quantity, values: [...out] }).toEqual({
          quantity,
          values: [...redshifts].map((z) => c[quantity](z)),
        })
        expect({ quantity, values: [...c.batch(quantity, redshifts.slice())] }).toEqual({
          quantity,
          values: [...out],
        })
        const inPlace = redshifts.slice()
        expect({ quantity, values: [...c.batch(quantity, inPlace, inPlace)] }).toEqual({
          quantity,
          values: [...out],
        })
      }
    },
  )

  it('a batch refuses what one at a time refuses, and an array of another length', () => {
    const c = models.bounce
    for (const bad of [NaN, -1, 2, Infinity, -0.1]) {
      expect(() => c.batch('luminosityMpc', Float64Array.of(0.1, bad))).toThrow(ScienceError)
      expect(() => c.luminosityMpc(bad)).toThrow(ScienceError)
    }
    expect(() => models.closed.batch('comovingVolumeMpc3', Float64Array.of(0.1, NaN))).toThrow(
      'must be a number',
    )
    expect(() => universe({ Ode0: 1.7 }).batch('luminosityMpc', Float64Array.of(0.1, 2))).toThrow('antipode')
    expect(() => c.batch('ageGyr', Float64Array.of(0.1))).toThrow('no big bang')
    expect(() => c.batch('E', Float64Array.of(1, 1), new Float64Array(1))).toThrow('another length')
    expect([...c.batch('lookbackGyr', Float64Array.of(-0.5, 0.5))]).toEqual([
      c.lookbackGyr(-0.5),
      c.lookbackGyr(0.5),
    ])
  })
})
