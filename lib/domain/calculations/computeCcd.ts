import { z } from 'zod'
import { refuse } from '@/lib/errors'
import { ccd, exposureEngineVersion } from '@/lib/science/exposure'
import { asRefused } from './asRefused'
import { exactly } from './exactly'

const number = z.number('This is a number.')
const amount = number.min(0, 'This is 0 or more.')

/** Electrons and seconds; `timeS` is the total over all exposures. */
export const ccdRequest = exactly({
  sourceRate: number.gt(0, 'A source gives more than 0 electrons a second.'),
  skyRatePerPixel: amount,
  darkRatePerPixel: amount,
  readNoise: amount,
  pixels: number.gt(0, 'A source covers more than 0 pixels.'),
  exposures: number.int('This is a whole number.').min(1, 'There is at least one exposure.').default(1),
  solve: z.enum(['snr', 'time'], 'Solve for snr or time.'),
  timeS: number.gt(0, 'A time is more than 0 s.').optional(),
  snr: number.gt(0, 'A signal-to-noise is more than 0.').optional(),
})

export type CcdRequest = z.output<typeof ccdRequest>

/** Signal-to-noise from time, or time from signal-to-noise, by the CCD equation. */
export function computeCcd(input: CcdRequest) {
  if (input.solve === 'snr' && input.timeS === undefined)
    throw refuse.field('timeS', 'Give the total time, in seconds, to solve for signal-to-noise.')
  if (input.solve === 'time' && input.snr === undefined)
    throw refuse.field('snr', 'Give the signal-to-noise wanted, to solve for time.')
  const { snr, timeS } = asRefused('', () => ccd(input))
  return { engine: exposureEngineVersion, snr, timeS }
}
