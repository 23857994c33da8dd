import { cosmologyFormSchema } from '@/lib/domain/proposals/cosmologyForm'
import type { CosmologyParameters } from '@/lib/science/cosmology'
import { formatNumber } from '@/lib/format'
import type { OwnText } from './state'
import { typedQuantity, type Expected } from './typedQuantity'

export type OwnTroubles = Partial<Record<keyof OwnText, string>>
export type ReadOwn = { ok: true; parameters: CosmologyParameters } | { ok: false; troubles: OwnTroubles }

/** Fields that take a unit; the others are plain numbers. */
const withUnits: Partial<Record<keyof OwnText, Expected>> = {
  H0: { unit: 'km/s/Mpc', what: 'The Hubble constant', example: '70 km/s/Mpc' },
  Tcmb0: { unit: 'K', what: 'The temperature of the background', example: '2.7255 K' },
}
const mass: Expected = { unit: 'eV', what: 'A neutrino mass', example: '0.06 eV' }

/** The text without its unit, for the form's own reading; unchanged where no unit was typed. */
function unitless(text: string, expected: Expected): { text: string } | { message: string } {
  if (!/[a-z]/i.test(text.replace(/e[+\-−]?\d/i, ''))) return { text }
  const read = typedQuantity(text, expected)
  return read.ok ? { text: String(read.value) } : { message: read.message }
}

function masses(text: string): { text: string } | { message: string } {
  const pieces = text.split(/[,;]/).map((piece) => piece.trim())
  const read = pieces.map((piece) => unitless(piece, mass))
  const bad = read.find((one) => 'message' in one)
  if (bad) return bad
  return { text: read.map((one) => ('text' in one ? one.text : '')).join(', ') }
}

/** A name made of what matters: `Own: Ωm 0.30, ΩΛ 1.75`. */
export function ownName({ H0, Om0, Ode0, w0, wa }: CosmologyParameters): string {
  const parts = [`Ωm ${formatNumber(Om0, 2)}`]
  if (Ode0 === 'flat') parts.unshift(`H₀ ${formatNumber(H0, Number.isInteger(H0) ? 0 : 2)}`)
  else parts.push(`ΩΛ ${formatNumber(Ode0, 2)}`)
  if (w0 !== -1) parts.push(`w₀ ${formatNumber(w0, 2)}`)
  if (wa !== 0) parts.push(`wₐ ${formatNumber(wa, 2)}`)
  return `Own: ${parts.join(', ')}`
}

/** The universe typed, or the sentence at each field that keeps it from being one. */
export function readOwn(own: OwnText): ReadOwn {
  const troubles: OwnTroubles = {}
  const plain: OwnText = { ...own }
  for (const [field, expected] of Object.entries(withUnits) as [keyof OwnText, Expected][]) {
    const read = unitless(own[field], expected)
    if ('message' in read) troubles[field] = read.message
    else Object.assign(plain, { [field]: read.text })
  }
  const read = masses(own.mNuEv)
  if ('message' in read) troubles.mNuEv = read.message
  else plain.mNuEv = read.text
  if (Object.keys(troubles).length > 0) return { ok: false, troubles }

  const result = cosmologyFormSchema.safeParse({ ...plain, choice: 'custom', comparison: '' })
  if (!result.success) {
    for (const { path, message } of result.error.issues)
      troubles[(path[0] as keyof OwnText | undefined) ?? 'Om0'] ??= message
    return { ok: false, troubles }
  }
  const { parameters } = result.data
  return { ok: true, parameters: own.name.trim() ? parameters : { ...parameters, name: ownName(parameters) } }
}
