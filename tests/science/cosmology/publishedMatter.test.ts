import { describe, expect, it } from 'vitest'
import {
  findPreset,
  massiveNeutrinoDensity,
  matterWithoutNeutrinos,
  type PublishedMatter,
} from '../../../lib/science/cosmology'
import { ScienceError } from '../../../lib/science/ScienceError'
import { fixture } from '../support/fixture'
import { relativeError } from '../support/relativeError'

type Row = Omit<PublishedMatter, 'publishedOm'> & { massive: number }

const { source, matter } = fixture<{ source: string; matter: Row[] }>('nearby')
const planck = { H0KmSMpc: 67.66, publishedOm: 0.3111, Tcmb0K: 2.7255, Neff: 3.046, mNuEv: [0, 0, 0.06] }

describe('matter without massive neutrinos', () => {
  it.each(matter)(`independent code: ${source}, masses $mNuEv eV`, ({ massive, ...given }) => {
    expect(relativeError(massiveNeutrinoDensity(given), massive)).toBeLessThan(1e-8)
    expect(matterWithoutNeutrinos({ ...given, publishedOm: 0.3 })).toBeCloseTo(0.3 - massive, 10)
  })

  it('published value: Planck 2018 prints 0.3111 ± 0.0056 with neutrinos, of which the preset has the rest', () => {
    // Planck Collaboration 2020, A&A 641, A6, table 2, last column; four decimals were printed.
    const { Om0 } = findPreset('planck-2018').parameters
    expect(Math.abs(matterWithoutNeutrinos(planck) - Om0)).toBeLessThan(5e-5)
  })

  it('without masses, or without a background, nothing is taken away', () => {
    expect(matterWithoutNeutrinos({ ...planck, mNuEv: [0, 0, 0] })).toBe(0.3111)
    expect(matterWithoutNeutrinos({ ...planck, Tcmb0K: 0 })).toBe(0.3111)
  })

  it('refuses where neutrinos alone are more than the matter', () => {
    const run = () => matterWithoutNeutrinos({ ...planck, mNuEv: [10, 10, 10] })
    expect(run).toThrow(ScienceError)
    expect(run).toThrow(
      'Neutrinos of these masses alone make Ων = 0.707, more than the matter density given.',
    )
    expect(() => matterWithoutNeutrinos({ ...planck, publishedOm: -0.1 })).toThrow('0 or more')
    expect(() => matterWithoutNeutrinos({ ...planck, Neff: 2 })).toThrow('3 neutrino masses were given for 2')
  })
})
