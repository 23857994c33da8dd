import { stellarMasses } from '@/lib/science/cosmology'

/** Galaxies by stellar mass, as readers write it: `10¹⁰·⁰ to 10¹⁰·⁵` is hard to read, its logarithm is not. */
export const massChoices = [
  { value: 'none', label: 'left out' },
  ...stellarMasses.map((value) => ({
    value,
    label: value.startsWith('above-')
      ? `log m above ${value.slice(6)}`
      : `log m ${value.replace('-', ' to ')}`,
  })),
] as const
