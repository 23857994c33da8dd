import { restLines } from '@/lib/science/light'

export const shapes = [
  { value: 'point', label: 'point source' },
  { value: 'sersic', label: 'Sérsic profile' },
  { value: 'uniform', label: 'uniform disc' },
]

export const spectra = [
  { value: 'flat', label: 'flat in f_ν' },
  { value: 'power-law', label: 'power law' },
  { value: 'black-body', label: 'black body' },
  { value: 'table', label: 'from a table' },
]

export const redshiftKinds = [
  { value: 'spectroscopic', label: 'spectroscopic' },
  { value: 'photometric', label: 'photometric' },
  { value: 'assumed', label: 'assumed' },
]

export const frames = [
  { value: 'heliocentric', label: 'heliocentric' },
  { value: 'cmb', label: 'CMB' },
]

export const provenances = [
  { value: 'observed', label: 'observed' },
  { value: 'predicted', label: 'predicted from a luminosity' },
]

export const lines = [
  { value: '', label: 'none' },
  ...restLines
    .filter(({ nature }) => nature === 'emission')
    .map(({ name }) => ({ value: name, label: name })),
]

export const lineKinds = [
  { value: 'flux', label: 'flux, erg/s/cm²' },
  { value: 'luminosity', label: 'luminosity, erg/s' },
]
