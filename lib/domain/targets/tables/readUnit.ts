/** A unit as a factor to radian, metre, gram, second, kelvin and magnitude, and its power of each. */
export interface Unit {
  factor: number
  powers: Readonly<Record<string, number>>
}

const atom = (factor: number, powers: Record<string, number>): Unit => ({ factor, powers })
const degree = Math.PI / 180
const energy = { m: 2, g: 1, s: -2 }

/** IAU Style Manual (1989) and the VOUnits list: the Julian year of 365.25 days; 1 erg is 1e-7 J. */
const atoms = new Map<string, Unit>([
  ['rad', atom(1, { rad: 1 })],
  ...['deg', 'degree', 'degrees', '°'].map((name) => [name, atom(degree, { rad: 1 })] as const),
  ...['hourangle', 'hour', 'hours'].map((name) => [name, atom(15 * degree, { rad: 1 })] as const),
  ...['arcmin', "'", '′'].map((name) => [name, atom(degree / 60, { rad: 1 })] as const),
  ...['arcsec', 'asec', '"', '″'].map((name) => [name, atom(degree / 3600, { rad: 1 })] as const),
  ['mas', atom(degree / 3.6e6, { rad: 1 })],
  ['uas', atom(degree / 3.6e9, { rad: 1 })],
  ['s', atom(1, { s: 1 })],
  ['min', atom(60, { s: 1 })],
  ['h', atom(3600, { s: 1 })],
  ['d', atom(86_400, { s: 1 })],
  ['day', atom(86_400, { s: 1 })],
  ...['yr', 'a', 'year', 'years', 'Julian_year'].map((name) => [name, atom(31_557_600, { s: 1 })] as const),
  ['cy', atom(3_155_760_000, { s: 1 })],
  ['m', atom(1, { m: 1 })],
  ['cm', atom(1e-2, { m: 1 })],
  ['mm', atom(1e-3, { m: 1 })],
  ['um', atom(1e-6, { m: 1 })],
  ['nm', atom(1e-9, { m: 1 })],
  ...['Angstrom', 'angstrom', 'AA', 'Å'].map((name) => [name, atom(1e-10, { m: 1 })] as const),
  ['km', atom(1e3, { m: 1 })],
  ['g', atom(1, { g: 1 })],
  ['kg', atom(1e3, { g: 1 })],
  ['J', atom(1e3, energy)],
  ['erg', atom(1e-4, energy)],
  ['W', atom(1e3, { ...energy, s: -3 })],
  ['mW', atom(1, { ...energy, s: -3 })],
  ['kW', atom(1e6, { ...energy, s: -3 })],
  ['K', atom(1, { K: 1 })],
  ['kK', atom(1e3, { K: 1 })],
  ['Jy', atom(1e-23, { g: 1, s: -2 })],
  ['mJy', atom(1e-26, { g: 1, s: -2 })],
  ['uJy', atom(1e-29, { g: 1, s: -2 })],
  ...['mag', 'mags', 'ABmag', 'STmag'].map((name) => [name, atom(1, { mag: 1 })] as const),
])

function times(a: Unit, b: Unit, power: number): Unit {
  const powers: Record<string, number> = { ...a.powers }
  for (const [base, exponent] of Object.entries(b.powers)) {
    const sum = (powers[base] ?? 0) + exponent * power
    if (sum === 0) delete powers[base]
    else powers[base] = sum
  }
  return { factor: a.factor * b.factor ** power, powers }
}

const token =
  /\s*(?:(10(?:\*\*|\^)?[+-]\d+|[+-]?\d+(?:\.\d+)?(?:e[+-]?\d+)?)|([\p{L}°′″'"]+(?:_\p{L}+)?)|(\*\*|[\^*./()]))/iuy

const tokensOf = (text: string): string[] | null => {
  const tokens: string[] = []
  token.lastIndex = 0
  while (token.lastIndex < text.trimEnd().length) {
    const found = token.exec(text)
    if (!found) return null
    tokens.push(found[0].trim())
  }
  return tokens
}

const numberOf = (text: string): number => {
  const power = /^10(?:\*\*|\^)?([+-]\d+)$/.exec(text)
  return power ? 10 ** Number(power[1]) : Number(text)
}

/**
 * Reads a unit as astronomical tables write it: 'mas/yr', 'mas.yr-1', 'mas yr**-1', 'erg / (cm2 s)',
 * '1e-17 erg/s/cm2', '10-20W/m2' (VOUnits 1.0, the CDS standard for catalogues and the FITS standard agree on these).
 * An empty text and '-' are pure numbers. Null when it is no unit known here.
 */
export function readUnit(written: string): Unit | null {
  const text = written
    .trim()
    .replace(/^\[(.*)\]$|^mag\((?:AB|ST)\)$/, (_, inside?: string) => inside ?? 'mag')
  if (text === '' || text === '-' || text === '---') return atom(1, {})
  if (text.length > 60) return null
  const tokens = tokensOf(text.replaceAll('\u2212', '-').replaceAll('μ', 'u').replaceAll('µ', 'u'))
  if (!tokens) return null
  let place = 0

  const exponent = (): number => {
    const marked = tokens[place] === '**' || tokens[place] === '^'
    if (marked) place += 1
    const bracketed = marked && tokens[place] === '('
    if (bracketed) place += 1
    const next = tokens[place] ?? ''
    if (!/^[+-]?\d+$/.test(next)) return marked ? Number.NaN : 1
    place += bracketed ? 2 : 1
    return Number(next)
  }
  const factor = (depth: number): Unit | null => {
    const next = tokens[place] ?? ''
    place += 1
    if (next === '(' && depth < 4) {
      const inside = product(depth + 1)
      if (!inside || tokens[place] !== ')') return null
      place += 1
      return times(atom(1, {}), inside, exponent())
    }
    if (/^\d/.test(next)) return atom(numberOf(next), {})
    const known = atoms.get(next)
    return known ? times(atom(1, {}), known, exponent()) : null
  }
  const product = (depth: number): Unit | null => {
    let whole = factor(depth)
    while (whole && place < tokens.length && tokens[place] !== ')') {
      const sign = tokens[place] ?? ''
      if (/^[*./]$/.test(sign)) place += 1
      const next = factor(depth)
      whole = next && times(whole, next, sign === '/' ? -1 : 1)
    }
    return whole
  }
  const unit = product(0)
  return unit && place === tokens.length && Number.isFinite(unit.factor) ? unit : null
}
