import { describe, expect, it } from 'vitest'
import { readOwn } from '@/lib/domain/tools/yardstick/ownCosmology'
import { emptyOwn, type OwnText } from '@/lib/domain/tools/yardstick/state'

// Seen to fail with the unit of H0 left out, and with the matter density that counts neutrinos taken as it stands.

const read = (own: Partial<OwnText>) => readOwn({ ...emptyOwn, ...own })

describe('own parameters', () => {
  it('are a flat universe of round numbers when nothing is typed', () => {
    expect(read({})).toMatchObject({
      ok: true,
      parameters: { name: 'Own: H₀ 70, Ωm 0.30', H0: 70, Om0: 0.3, Ode0: 'flat', w0: -1, wa: 0 },
    })
  })

  it('take units where a quantity is expected', () => {
    expect(read({ H0: '0.0677 km/s/kpc', Tcmb0: '2725.5 mK', mNuEv: '0 eV, 60 meV' })).toMatchObject({
      ok: true,
      parameters: { H0: 67.7, Tcmb0: 2.7255, mNuEv: [0, 0.06] },
    })
  })

  it('take a published matter density that counts its neutrinos', () => {
    const given = read({
      H0: '67.66',
      Om0: '0.3111',
      omCounts: 'all',
      Tcmb0: '2.7255',
      Neff: '3.046',
      mNuEv: '0, 0, 0.06',
    })
    // Planck Collaboration 2020, table 2: Omega_m = 0.3111 with neutrinos; Astropy's Planck18 has Om0 = 0.30966.
    expect(given.ok && given.parameters.Om0).toBeCloseTo(0.30966, 3)
  })

  it.each([
    [{ H0: '0' }, 'H0', 'The Hubble constant H₀ must be above 0 km/s/Mpc.'],
    [{ H0: '70 km/s' }, 'H0', 'The Hubble constant is given in km/s/Mpc or alike, such as 70 km/s/Mpc.'],
    [{ Om0: '-0.1' }, 'Om0', 'The matter density Ωm must be 0 or more.'],
    [{ Om0: 'NaN' }, 'Om0', 'The density of matter is a number.'],
    [{ Om0: 'Infinity' }, 'Om0', 'The density of matter is a number.'],
    [{ w0: '1e9' }, 'w0', 'w₀ must lie between −20 and 20.'],
    [{ mNuEv: '0, 0, 0, 0.06' }, 'mNuEv', '4 neutrino masses were given for 3 species.'],
    [{ mNuEv: 'heavy' }, 'mNuEv', 'A neutrino mass is a number with a unit, such as 0.06 eV.'],
    [{ name: 'planck 2018' }, 'name', 'A published cosmology has this name. Choose another.'],
  ] as const)('%j: the sentence stands at its field', (own, field, sentence) => {
    expect(read(own)).toEqual({ ok: false, troubles: { [field]: sentence } })
  })
})
