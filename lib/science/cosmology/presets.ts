import type { CosmologyParameters } from './parameters'

export type CosmologyId =
  | 'planck-2018'
  | 'planck-2015'
  | 'wmap-9'
  | 'flat-70-30'
  | 'einstein-de-sitter'
  | 'open-30'
  | 'local-ladder'
  | 'evolving-dark-energy'

/** A named model. `standing` says whether data support it now, or it marks the end of a range of models. */
export interface CosmologyPreset {
  readonly id: CosmologyId
  readonly parameters: CosmologyParameters
  readonly citation: string
  readonly standing: 'current' | 'limiting'
}

const empty = { w0: -1, wa: 0, Tcmb0: 0, Neff: 0, mNuEv: [] } as const
const planck = { Ode0: 'flat', w0: -1, wa: 0, Tcmb0: 2.7255, Neff: 3.046, mNuEv: [0, 0, 0.06] } as const

export const cosmologyPresets: readonly CosmologyPreset[] = [
  {
    id: 'planck-2018',
    parameters: { name: 'Planck 2018', H0: 67.66, Om0: 0.30966, ...planck },
    citation: 'Planck Collaboration 2020, A&A 641, A6, table 2, last column (TT,TE,EE+lowE+lensing+BAO)',
    standing: 'current',
  },
  {
    id: 'planck-2015',
    parameters: { name: 'Planck 2015', H0: 67.74, Om0: 0.3075, ...planck },
    citation: 'Planck Collaboration 2016, A&A 594, A13, table 4, last column (TT,TE,EE+lowP+lensing+ext)',
    standing: 'current',
  },
  {
    id: 'wmap-9',
    parameters: { name: 'WMAP 9', H0: 69.32, Om0: 0.2865, ...planck, Tcmb0: 2.725, Neff: 3.04, mNuEv: [] },
    citation: 'Hinshaw et al. 2013, ApJS 208, 19, table 4, last column (WMAP+eCMB+BAO+H0)',
    standing: 'current',
  },
  {
    id: 'flat-70-30',
    parameters: { name: 'Flat 70/0.3', H0: 70, Om0: 0.3, Ode0: 'flat', ...empty },
    citation: 'A round-number convention: H₀ = 70 km/s/Mpc, Ωm = 0.3, no radiation',
    standing: 'limiting',
  },
  {
    id: 'einstein-de-sitter',
    parameters: { name: 'Einstein–de Sitter', H0: 70, Om0: 1, Ode0: 0, ...empty },
    citation: 'Einstein & de Sitter 1932, PNAS 18, 213; H₀ = 70 km/s/Mpc by convention',
    standing: 'limiting',
  },
  {
    id: 'open-30',
    parameters: { name: 'Open 0.3', H0: 70, Om0: 0.3, Ode0: 0, ...empty },
    citation:
      'Matter alone, open space: Mattig 1958, Astron. Nachr. 284, 109; H₀ = 70 km/s/Mpc by convention',
    standing: 'limiting',
  },
  {
    id: 'local-ladder',
    parameters: { name: 'Local ladder, H₀ 73.04', H0: 73.04, Om0: 0.3, ...planck },
    citation: 'Riess et al. 2022, ApJ 934, L7 (H₀ = 73.04 ± 1.04 km/s/Mpc); Ωm = 0.3 by convention',
    standing: 'current',
  },
  {
    id: 'evolving-dark-energy',
    parameters: {
      name: 'Evolving dark energy',
      H0: 67.51,
      Om0: 0.31,
      ...planck,
      w0: -0.838,
      wa: -0.62,
    },
    citation:
      'DESI Collaboration 2025, arXiv:2503.14738, table V, DESI + CMB + Pantheon+ (Ωm = 0.3114 with neutrinos, w₀ = −0.838, wₐ = −0.62)',
    standing: 'current',
  },
]
