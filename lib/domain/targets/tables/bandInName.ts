import { bandChoice } from '../bands'
import type { TableColumn } from './types'

const named =
  /^(?:(?:m|mag|MAG|Mag)_?)?([ugrizyUBVRIJHK]|Ks)(?:_?(?:mag|MAG|Mag))?(?:_?(ab|AB|vega|Vega|VEGA))?$/
const byWavelength: Readonly<Record<string, string>> = {
  u: 'u',
  b: 'B',
  v: 'V',
  r: 'r',
  i: 'i',
  j: 'J',
  h: 'H',
  k: 'K',
}
const spelled: Readonly<Record<string, string>> = { U: 'u', Ks: 'K' }

/**
 * The band a column of magnitudes is named after, 'Vmag' or 'mag_r', or that its UCD gives; with its system where the
 * name ends in one. Null where neither says.
 */
export function bandInName({ name, ucd }: TableColumn): string | null {
  const [, letter, ending] = named.exec(name.replace(/[([].*$/, '').trim()) ?? []
  if (letter) {
    const system = ending ?? /[([]\s*(ab|vega)\s*[)\]]/i.exec(name)?.[1]
    const band = spelled[letter] ?? letter
    return system ? bandChoice(band, system.toLowerCase() === 'ab' ? 'AB' : 'Vega') : band
  }
  const wavelength = /em\.(?:opt\.([ubvri])|ir\.([jhk]))\b/i.exec(ucd)
  return byWavelength[(wavelength?.[1] ?? wavelength?.[2] ?? '').toLowerCase()] ?? null
}
