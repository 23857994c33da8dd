import type { Observation } from '@/lib/domain/proposals/types'

/** What a signal-to-noise is counted in. */
export const snrWords: Readonly<Record<Observation['snrPer'], string>> = {
  image: 'of the image',
  pixel: 'per pixel',
  angstrom: 'per ångström',
  'resolution-element': 'per resolution element',
}
