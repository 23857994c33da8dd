import type { CosmologyQuantity, InvertibleQuantity, StellarMass } from '@/lib/science/cosmology'

export const modes = ['distances', 'compare', 'near', 'survey', 'inverse'] as const
export type Mode = (typeof modes)[number]

/** Own parameters exactly as typed; an empty dark energy makes the universe flat. */
export interface OwnText {
  name: string
  H0: string
  Om0: string
  /** Whether the matter density typed counts massive neutrinos, as many papers do. */
  omCounts: 'matter' | 'all'
  Ode0: string
  w0: string
  wa: string
  Tcmb0: string
  Neff: string
  mNuEv: string
}

/** A published cosmology by its id, or own parameters. */
export type Chosen = { own: null; id: string } | { own: OwnText; id: null }

/** Everything the page shows, as typed: the address holds it, and nothing that cannot be read is lost. */
export interface YardstickState {
  mode: Mode
  /** The list of redshifts. */
  z: string
  /** One to six. */
  cosmologies: Chosen[]
  columns: CosmologyQuantity[]
  /** The quantity drawn. */
  draw: CosmologyQuantity
  /** Which cosmology the others are set against, counted from 0. */
  reference: number
  frame: 'heliocentric' | 'cmb'
  ra: string
  dec: string
  /** A galaxy's own motion, one standard deviation. */
  motion: string
  /** Of a survey, with a unit of solid angle. */
  area: string
  /** Objects in a comoving volume; empty where only the volume is asked. */
  density: string
  /** The galaxies whose clustering counts; none where it is left out. */
  mass: StellarMass | 'none'
  from: InvertibleQuantity
  /** The values to find redshifts for. */
  values: string
}

export const MOST_COSMOLOGIES = 6
export const MOST_COLUMNS = 8

/** Own parameters before anything is typed: a flat universe of round numbers. Left out, they mean this. */
export const emptyOwn: OwnText = {
  name: '',
  H0: '70',
  Om0: '0.3',
  omCounts: 'matter',
  Ode0: '',
  w0: '−1',
  wa: '0',
  Tcmb0: '0',
  Neff: '3.046',
  mNuEv: '',
}

export const usualState: YardstickState = {
  mode: 'distances',
  z: '0.407\n0.657\n1.290\n1.678\n2.375\n6.6145',
  cosmologies: [
    { own: null, id: 'planck-2018' },
    { own: null, id: 'local-ladder' },
    { own: null, id: 'einstein-de-sitter' },
  ],
  columns: ['luminosityMpc', 'kpcPerArcsec', 'lookbackGyr'],
  draw: 'angularDiameterMpc',
  reference: 0,
  frame: 'heliocentric',
  ra: '12 26 27',
  dec: '+31 13 20',
  motion: '300 km/s',
  area: '1.5 deg²',
  density: '1e-3 Mpc⁻³',
  mass: '10.0-10.5',
  from: 'ageGyr',
  values: '1 Gyr\n3.3 Gyr\n8 Gyr',
}
