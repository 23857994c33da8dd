import type { ModeRecord } from '../exposure'
import type { SpectralShape } from '../light'
import { sayAngstrom, sayNumber } from './saying'
import type { ReportTarget } from './types'

/** Where a mode looks, in words: its band for an image, a wavelength of a spectrum. */
export function sayPlace(mode: Pick<ModeRecord, 'kind' | 'band'>, vacuumA: number): string {
  return mode.kind === 'imaging' && mode.band ? `in ${mode.band}` : `at ${sayAngstrom(vacuumA)}`
}

/** A number without zeros at its end, two decimals at most. */
const short = (value: number) => sayNumber(value, 2).replace(/\.?0+$/, '')

function sayShape(shape: SpectralShape, z: number): string {
  if (shape.kind === 'power-law') return `α = ${short(shape.index)}`
  if (shape.kind === 'table') return 'the spectrum given'
  const at = z > 0 ? ` at z = ${sayNumber(z, 2)}` : ''
  return `a black body of ${sayNumber(shape.temperatureK, 0)}\u00a0K${at}`
}

export interface Carried {
  readonly target: Pick<ReportTarget, 'redshift' | 'galacticEbv'>
  readonly spectrum: SpectralShape
  readonly band: string
  /** Where to, as sayPlace has it. */
  readonly to: string
  readonly colourMag: number
}

/** How a magnitude was carried from its band, in a sentence: 'Carried from i to H with α = −0.5: +0.31 mag.' */
export function sayCarried({ target, spectrum, band, to, colourMag }: Carried): string {
  const shape = sayShape(spectrum, target.redshift ?? 0)
  const sign = colourMag > 0 ? '+' : ''
  const change = Math.abs(colourMag) < 0.005 ? 'no change' : `${sign}${sayNumber(colourMag, 2)}\u00a0mag`
  const dust = target.galacticEbv ? ', the dust of the Galaxy counted' : ''
  return `Carried from ${band} to ${to.replace(/^(in|at) /, '')} with ${shape}${dust}: ${change}.`
}
