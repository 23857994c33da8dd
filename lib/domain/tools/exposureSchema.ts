import { z } from 'zod'
import { SERSIC_LEAST, SERSIC_MOST } from '@/lib/science/exposure'
import { parseMagnitude } from '@/lib/science/magnitude'
import { readBandChoice } from '../targets/bands'
import { notBetween, numberBetween, numberOf } from './texts'

const text = z.string().trim().max(60)

const fields = z.object({
  mode: z.string().min(1, 'Choose a mode.').max(60),
  /** What is asked: how long, how deep in a time, or how faint. */
  solve: z.enum(['time', 'snr', 'limit']),
  snr: text,
  hours: text,
  source: z.enum(['continuum', 'line']),
  magnitude: text,
  band: z.string().refine((choice) => readBandChoice(choice) !== null, 'Choose a band.'),
  /** erg/s/cm^2. */
  flux: text,
  /** Observed wavelength of the line, angstroms, as the mode counts it. */
  wavelength: text,
  /** Intrinsic full width at half maximum, km/s. */
  width: text,
  shape: z.enum(['point', 'galaxy', 'uniform']),
  radius: text,
  sersic: text,
  area: text,
  /** The shape of the continuum, which carries the magnitude to the mode. */
  spectrum: z.enum(['flat', 'power-law', 'black-body']),
  index: text,
  /** Kelvin, at rest with the source. */
  temperature: text,
  redshift: text,
  moon: z.enum(['dark', 'grey', 'bright']),
  airmass: numberBetween('An airmass', 1, 3),
  seeing: numberBetween('An image quality', 0.3, 4),
  clouds: z.enum(['photometric', 'clear', 'thin-cloud']),
  slit: z.enum(['parallactic', 'across']),
})

export type ExposureInput = z.input<typeof fields>

function fluxTrouble(typed: string): string | null {
  const value = numberOf(typed)
  if (value === null) return 'A flux is a number, such as 2.5e-17.'
  return value > 0 && value < 1 ? null : 'A line flux in erg/s/cm² lies above 0 and far below 1.'
}

function magnitudeTrouble(typed: string): string | null {
  const answer = parseMagnitude(typed)
  return answer.ok ? null : answer.message
}

function spectrumTroubles({ spectrum, index, temperature, redshift }: ExposureInput) {
  if (spectrum === 'power-law') return [['index', notBetween('A spectral index', -10, 10, index)] as const]
  if (spectrum === 'flat') return []
  const temperatureTrouble = notBetween('A temperature in kelvin', 100, 1_000_000, temperature)
  return [
    ['temperature', temperatureTrouble] as const,
    ['redshift', notBetween('A redshift', 0, 20, redshift)] as const,
  ]
}

/** What only counts for the question, the source or the shape chosen. */
function troubles(asked: ExposureInput): [keyof ExposureInput, string | null][] {
  const { source, shape, solve } = asked
  return [
    ...(solve === 'snr' ? [] : [['snr', notBetween('A signal-to-noise', 0.1, 100_000, asked.snr)] as const]),
    ...(solve === 'time'
      ? []
      : [['hours', notBetween('A time in hours', 0.0003, 1000, asked.hours)] as const]),
    ...(solve === 'limit'
      ? []
      : source === 'line'
        ? [['flux', fluxTrouble(asked.flux)] as const]
        : [['magnitude', magnitudeTrouble(asked.magnitude)] as const]),
    ...(source === 'line'
      ? [
          ['wavelength', notBetween('A wavelength in angstroms', 3000, 26_000, asked.wavelength)] as const,
          ['width', notBetween('A line width in km/s', 0, 20_000, asked.width)] as const,
        ]
      : []),
    ...(source === 'line' ? [] : spectrumTroubles(asked)),
    ...(shape === 'galaxy'
      ? [
          ['radius', notBetween('A half-light radius', 0.01, 60, asked.radius)] as const,
          ['sersic', notBetween('A Sérsic index', SERSIC_LEAST, SERSIC_MOST, asked.sersic)] as const,
        ]
      : []),
    ...(shape === 'uniform' ? [['area', notBetween('An area', 0.01, 10_000, asked.area)] as const] : []),
  ].map(([name, message]) => [name, message])
}

/** The whole question as it stands in the address; a field that does not count is not judged. */
export const exposureSchema = fields.superRefine((asked, context) => {
  for (const [name, message] of troubles(asked))
    if (message !== null) context.addIssue({ code: 'custom', path: [name], message })
})
