import { formatList } from '@/lib/format'
import { readQuantity } from './reading'
import type { ReadyUniverse } from './universes'

const NAMED = 4

/** Which of the redshifts a universe does not reach, and why; null where it reaches all. */
export function missingSentence(redshifts: readonly number[], { cosmology }: ReadyUniverse): string | null {
  const refused = [...new Set(redshifts)].flatMap((z) => {
    const { absent } = readQuantity(cosmology, 'transverseComovingMpc', z)
    return absent && z >= 0 ? [{ z, sentence: absent.sentence }] : []
  })
  const [first] = refused
  if (!first) return null
  if (refused.length === 1) return first.sentence
  // The antipode's sentence names the first of them already.
  const closed = cosmology.antipodeRedshift !== null
  const listed = closed ? refused.slice(1) : refused
  const named = listed.slice(0, NAMED).map(({ z }) => String(z))
  const rest = listed.length - named.length
  const words = rest > 0 ? `${named.join(', ')} and ${rest} more` : formatList(named)
  return closed
    ? `${first.sentence} The same holds for ${words}.`
    : `Of your redshifts, ${words} do not exist in it.`
}
