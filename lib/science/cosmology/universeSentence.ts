import { sayRedshift } from './redshiftCheck'
import type { Universe } from './universe'

const shapes = { flat: 'Flat', open: 'Open', closed: 'Closed' } as const

function gyr(time: number, decimals: number): string {
  return `${time.toFixed(time >= 100 ? 0 : decimals)} Gyr`
}

function future(u: Omit<Universe, 'sentence'>): string {
  if (u.fate === 'big-rip') return `tears apart in ${gyr(u.ripInGyr ?? 0, 1)}`
  if (u.fate === 'recollapses') {
    const whole = u.recollapseAgeGyr === null ? '' : `, ${gyr(u.recollapseAgeGyr, 1)} after it began`
    return `falls back together${whole}`
  }
  return 'expands forever'
}

/** A universe in a sentence or two, for the head of a table. */
export function describeUniverse(
  u: Omit<Universe, 'sentence'>,
  acceleratingSinceGyr: number | null,
  fromStatic: boolean,
): string {
  const shape = shapes[u.shape]
  if (u.origin === 'bounce') {
    const when = `turned ${gyr(u.turnaroundGyr ?? 0, 1)} ago at z = ${sayRedshift(u.turnaroundRedshift ?? 0)}`
    return `${shape}, and without a big bang: it shrank, ${when}, and has grown since. No larger redshift exists.`
  }
  const start =
    u.origin === 'big-bang'
      ? `It began in a big bang ${gyr(u.ageGyr ?? 0, 2)} ago`
      : fromStatic
        ? 'It left a static state and had no big bang'
        : 'It had no beginning'
  const spell =
    u.loiteringRedshift === null ? '' : `, loitered around z = ${sayRedshift(u.loiteringRedshift)}`
  if (u.accelerating) {
    const ago = acceleratingSinceGyr === null ? '' : ` (${gyr(acceleratingSinceGyr, 1)} ago)`
    const since =
      u.acceleratingSinceRedshift === null
        ? 'has always been speeding up'
        : `has been speeding up since z = ${sayRedshift(u.acceleratingSinceRedshift)}${ago}`
    return `${shape}. ${start}${spell}, ${since} and ${future(u)}.`
  }
  if (u.fate !== 'expands-forever') return `${shape}. ${start}${spell}, slows and ${future(u)}.`
  const end = u.shape === 'flat' ? 'never quite stops' : 'never stops'
  return `${shape}. ${start}${spell}, slows for all time, and ${end}.`
}
