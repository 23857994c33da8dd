import { create, createUnitDependencies, unitDependencies, type MathJsInstance, type Unit } from 'mathjs'
import { GYR_S, MPC_KM } from '@/lib/science/constants'

let kept: Pick<MathJsInstance, 'unit' | 'createUnit'> | null = null

/**
 * Units of the library, with those of astronomers that it lacks, on an instance of our own: the definitions
 * would otherwise change everyone's. Made when first asked for.
 */
function units(): Pick<MathJsInstance, 'unit' | 'createUnit'> {
  if (kept) return kept
  const own = create({ ...unitDependencies, ...createUnitDependencies })
  const parsec = `${MPC_KM / 1e3} m`
  const year = `${GYR_S / 1e9} s`
  own.createUnit({
    pc: { definition: parsec, prefixes: 'short' },
    parsec: { definition: parsec, prefixes: 'long', aliases: ['parsecs'] },
    yr: { definition: year, prefixes: 'short', aliases: ['a'] },
    // Light for one Julian year: IAU.
    ly: { definition: '9460730472580800 m', prefixes: 'short' },
    lightyear: { definition: '9460730472580800 m', prefixes: 'long', aliases: ['lightyears'] },
    au: { definition: '149597870700 m', prefixes: 'short', aliases: ['AU'] },
    mag: { prefixes: 'none', aliases: ['magnitude', 'magnitudes'] },
  })
  kept = own
  return own
}

const MOST_CHARACTERS = 40
/** Names, powers and fractions of units; nothing that could be a call, a list or an assignment. */
const UNIT_WORDS = /^[A-Za-z][A-Za-z0-9^*/ ()+-]*$/

/**
 * A value in the unit written, converted to another; null when the words are no unit, NaN when the two measure
 * different things. Never runs an expression.
 */
export function convertUnit(value: number, words: string, wanted: string): number | null {
  const spelled = words
    .trim()
    .replace(
      /⁻?[¹²³]/g,
      (power) => `^${power.replace('⁻', '-').replace(/[¹²³]/, (digit) => String('¹²³'.indexOf(digit) + 1))}`,
    )
    .replace(/[⁻−]/g, '-')
    // Powers as FITS and VOUnits allow them: arcmin2, Mpc-3.
    .replace(/([A-Za-z])(-?[1-9])(?=$|[ */)])/g, '$1^$2')
  if (spelled.length > MOST_CHARACTERS || !UNIT_WORDS.test(spelled)) return null
  let typed: Unit
  try {
    typed = units().unit(value, spelled)
  } catch {
    return null
  }
  return typed.equalBase(units().unit(1, wanted)) ? typed.toNumber(wanted) : Number.NaN
}
