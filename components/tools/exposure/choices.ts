import type { RadioOption } from '@/components/forms/RadioField'
import type { SelectOption } from '@/components/forms/SelectField'

export const questions: readonly RadioOption[] = [
  { value: 'time', label: 'How long does it take?' },
  { value: 'snr', label: 'How good is it after a time?' },
  { value: 'limit', label: 'How faint can it be?' },
]

export const sources: readonly SelectOption[] = [
  { value: 'continuum', label: 'its light, as a magnitude' },
  { value: 'line', label: 'an emission line' },
]

export const spectra: readonly SelectOption[] = [
  { value: 'flat', label: 'flat in f_ν' },
  { value: 'power-law', label: 'a power law' },
  { value: 'black-body', label: 'a black body' },
]

export const shapes: readonly SelectOption[] = [
  { value: 'point', label: 'a point' },
  { value: 'galaxy', label: 'a galaxy' },
  { value: 'uniform', label: 'as bright everywhere' },
]

export const moons: readonly SelectOption[] = [
  { value: 'dark', label: 'no Moon' },
  { value: 'grey', label: 'a half Moon' },
  { value: 'bright', label: 'a full Moon' },
]

export const clouds: readonly SelectOption[] = [
  { value: 'photometric', label: 'a photometric sky' },
  { value: 'clear', label: 'a clear sky, 90 %' },
  { value: 'thin-cloud', label: 'thin cloud, 70 %' },
]

export const slits: readonly SelectOption[] = [
  { value: 'parallactic', label: 'along the dispersion of the air' },
  { value: 'across', label: 'across it' },
]
