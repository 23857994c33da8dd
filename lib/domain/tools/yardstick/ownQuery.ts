import { emptyOwn, type OwnText } from './state'

/** Names in the address, in the order they are written. */
const keys = [
  ['name', 'name'],
  ['H0', 'H0'],
  ['Om0', 'Om0'],
  ['omCounts', 'Om0counts'],
  ['Ode0', 'Ode0'],
  ['w0', 'w0'],
  ['wa', 'wa'],
  ['Tcmb0', 'Tcmb0'],
  ['Neff', 'Neff'],
  ['mNuEv', 'mNu'],
] as const satisfies readonly (readonly [keyof OwnText, string])[]

const escape = (text: string) => text.replace(/[%,:]/g, (mark) => `%${mark.charCodeAt(0).toString(16)}`)
const unescape = (text: string) =>
  text.replace(/%(25|2c|3a)/gi, (_, code: string) => String.fromCharCode(Number.parseInt(code, 16)))

/** Own parameters as the address spells them: `H0:70,Om0:0.3,Ode0:0.7,w0:-1.1`. What is usual is left out. */
export function writeOwn(own: OwnText): string {
  return keys
    .filter(([field]) => ['H0', 'Om0'].includes(field) || own[field] !== emptyOwn[field])
    .map(([field, key]) => `${key}:${escape(own[field].replaceAll('−', '-'))}`)
    .join(',')
}

/** The parameters an address gives; null when it names none. Values stay as typed, readable or not. */
export function readOwnQuery(text: string): OwnText | null {
  if (!text.includes(':')) return null
  const own: OwnText = { ...emptyOwn }
  let known = false
  for (const part of text.slice(0, 400).split(',')) {
    const colon = part.indexOf(':')
    const field = keys.find(([, key]) => key === part.slice(0, colon).trim())?.[0]
    if (!field) continue
    known = true
    const value = unescape(part.slice(colon + 1)).slice(0, 120)
    if (field === 'omCounts') own.omCounts = value === 'all' ? 'all' : 'matter'
    else own[field] = value
  }
  return known ? own : null
}
