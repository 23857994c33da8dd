import { z } from 'zod'
import { cosmologyPresets, stellarMasses, type CosmologyQuantity } from '@/lib/science/cosmology'
import { readOwnQuery, writeOwn } from './ownQuery'
import { quantities, quantityOf } from './quantities'
import { MOST_COLUMNS, MOST_COSMOLOGIES, modes, usualState, type Chosen, type YardstickState } from './state'

export type Query = Record<string, string | string[] | undefined>

/** Beyond this servers and mail programs cut addresses. */
const LONGEST_LINK = 12_000

/** Every key of the address that belongs to the state. */
export const stateKeys = [
  'mode',
  'z',
  'c',
  'q',
  'draw',
  'ref',
  'frame',
  'ra',
  'dec',
  'motion',
  'area',
  'density',
  'mass',
  'from',
  'values',
]

export const invertible = [
  'lookbackGyr',
  'ageGyr',
  'luminosityMpc',
  'angularDiameterMpc',
  'comovingMpc',
  'distanceModulusMag',
] as const

const drawable = z.enum(quantities.map(({ id }) => id) as [CosmologyQuantity, ...CosmologyQuantity[]])
const first = (value: string | string[] | undefined) => [value].flat()[0]
const text = (most: number, usual: string) => z.string().max(most).catch(usual)

/** Each piece on its own line, a range kept whole. */
const asLines = (list: string) =>
  list
    .trim()
    .replace(/\s+(?=step\s|by\s)|(step|by)\s+/g, (_, word: string | undefined) =>
      word ? `${word}\u0001` : '\u0001',
    )
    .split(/\s+/)
    .join('\n')
    .replaceAll('\u0001', ' ')

function chosenOf(given: readonly string[], troubles: string[]): Chosen[] {
  const chosen = given.flatMap((one): Chosen[] => {
    if (cosmologyPresets.some(({ id }) => id === one)) return [{ own: null, id: one }]
    const own = readOwnQuery(one)
    if (own) return [{ own, id: null }]
    troubles.push(`No cosmology is called “${one.slice(0, 40)}”.`)
    return []
  })
  if (chosen.length > MOST_COSMOLOGIES)
    troubles.push(`Six cosmologies stand side by side; the address names ${chosen.length}.`)
  return chosen.length > 0 ? chosen.slice(0, MOST_COSMOLOGIES) : usualState.cosmologies
}

function columnsOf(given: string | undefined, troubles: string[]): CosmologyQuantity[] {
  if (given === undefined) return usualState.columns
  const ids = [...new Set(given.split(',').filter(Boolean))]
  const known = ids.flatMap((id) => quantityOf(id)?.id ?? [])
  const unknown = ids.find((id) => !quantityOf(id))
  if (unknown) troubles.push(`No quantity is called “${unknown.slice(0, 40)}”.`)
  return known.length > 0 ? known.slice(0, MOST_COLUMNS) : usualState.columns
}

/**
 * The state an address asks for. What it does not say is as usual; what names nothing known is said in
 * `troubles`; redshifts, parameters and values stay as typed, and the page says at their fields what is wrong.
 */
export function readState(query: Query): { state: YardstickState; troubles: string[] } {
  const troubles: string[] = []
  const one = (key: string) => first(query[key])
  const pick = <T>(schema: z.ZodType<T>, key: string, usual: T): T => {
    const given = one(key)
    if (given === undefined) return usual
    const read = schema.safeParse(given)
    if (!read.success)
      troubles.push(`The address says “${key}=${given.slice(0, 40)}”, which means nothing here.`)
    return read.success ? read.data : usual
  }
  const given = [query.c].flat().filter((value): value is string => value !== undefined)
  const cosmologies = given.length > 0 ? chosenOf(given, troubles) : usualState.cosmologies
  const reference = Number(one('ref') ?? 1) - 1
  return {
    state: {
      mode: pick(z.enum(modes), 'mode', usualState.mode),
      z: one('z') === undefined ? usualState.z : asLines(one('z') ?? ''),
      cosmologies,
      columns: columnsOf(one('q'), troubles),
      draw: pick(drawable, 'draw', usualState.draw),
      reference:
        Number.isInteger(reference) && reference >= 0 && reference < cosmologies.length ? reference : 0,
      frame: pick(z.enum(['heliocentric', 'cmb']), 'frame', usualState.frame),
      ra: text(40, usualState.ra).parse(one('ra')),
      dec: text(40, usualState.dec).parse(one('dec')),
      motion: text(60, usualState.motion).parse(one('motion')),
      area: text(60, usualState.area).parse(one('area')),
      density: text(60, usualState.density).parse(one('density')),
      mass: pick(z.enum(['none', ...stellarMasses]), 'mass', usualState.mass),
      from: pick(z.enum(invertible), 'from', usualState.from),
      values: (one('values') ?? usualState.values).replace(/\s*;\s*/g, '\n'),
    },
    troubles,
  }
}

/** The query of a state; what is usual is left out. Null when it is too long for an address. */
export function writeState(state: YardstickState): URLSearchParams | null {
  // Text this long stays too long however its blanks are written; hundreds of thousands of values are not spelled out.
  if (state.z.length > 4 * LONGEST_LINK || state.values.length > 4 * LONGEST_LINK) return null
  const query = new URLSearchParams()
  const put = (key: string, value: string, usual: string) => {
    if (value !== usual) query.set(key, value)
  }
  put('mode', state.mode, usualState.mode)
  if (state.z !== usualState.z)
    query.set(
      'z',
      state.z
        .trim()
        .split(/[\s,;]+/)
        .join(' '),
    )
  const cosmologies = state.cosmologies.map(({ own, id }) => (own ? writeOwn(own) : id))
  if (cosmologies.join() !== usualState.cosmologies.map(({ id }) => id).join())
    for (const one of cosmologies) query.append('c', one)
  put('q', state.columns.join(','), usualState.columns.join(','))
  put('draw', state.draw, usualState.draw)
  put('ref', String(state.reference + 1), '1')
  put('frame', state.frame, usualState.frame)
  put('ra', state.ra, usualState.ra)
  put('dec', state.dec, usualState.dec)
  put('motion', state.motion, usualState.motion)
  put('area', state.area, usualState.area)
  put('density', state.density, usualState.density)
  put('mass', state.mass, usualState.mass)
  put('from', state.from, usualState.from)
  const values = (list: string) =>
    list
      .trim()
      .split(/\s*[\n;]\s*/)
      .join('; ')
  put('values', values(state.values), values(usualState.values))
  return query.toString().length <= LONGEST_LINK ? query : null
}
