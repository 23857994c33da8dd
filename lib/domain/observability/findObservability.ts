import { refuse } from '@/lib/errors'
import { mjdOf, skyEngineVersion } from '@/lib/science/sky'
import type { Context } from '../context'
import { readTelescopes, type TelescopeAtSite } from '../facility/readTelescopes'
import { latestMjd, longestDays, mostRows, usualDays } from './limits'
import type { ObservabilityAsked } from './readAsked'
import { windowsOf, type ObservableWindow } from './windowsOf'

export interface Observability {
  asked: ObservabilityAsked
  engine: string
  /** What was looked through. */
  fromMjd: number
  toMjd: number
  /** The end is the service's own limit, earlier than the one asked for. */
  isCutShort: boolean
  rows: (ObservableWindow & { facility: string })[]
  /** There are more rows than were asked for, or none were. */
  isOverflow: boolean
}

/** Telescopes by the name of one, or of the site they stand on, in any case; all when none is named. */
function telescopesNamed(all: readonly TelescopeAtSite[], name: string | undefined) {
  if (name === undefined) return all
  const wanted = name.toLowerCase()
  const found = all.filter(({ slug, name: own, site }) =>
    [slug, own, site.name].some((one) => one.toLowerCase() === wanted),
  )
  if (found.length > 0) return found
  const known = all.map((telescope) => telescope.name).join(', ')
  throw refuse.field('FACILITY', `There is no such FACILITY here; there are: ${known}.`)
}

function rangeOf(asked: ObservabilityAsked, now: Date) {
  const fromMjd = asked.TIME.fromMjd ?? mjdOf(now)
  const wanted = asked.TIME.toMjd ?? Math.min(fromMjd + usualDays, latestMjd)
  if (wanted <= fromMjd)
    throw refuse.field('TIME', 'TIME ends before it begins: without a beginning it is now.')
  const toMjd = Math.min(wanted, fromMjd + longestDays)
  return { fromMjd, toMjd, isCutShort: toMjd < wanted }
}

/** Every stretch in which the position asked about can be observed, in order of time, then of telescope. */
export async function findObservability(ctx: Context, asked: ObservabilityAsked): Promise<Observability> {
  const { now, telescopes } = await readTelescopes(ctx)
  const range = rangeOf(asked, now)
  const most = Math.min(asked.MAXREC ?? mostRows, mostRows)
  const named = telescopesNamed(telescopes, asked.FACILITY)
  // Telescopes of a site that can point alike are computed once.
  const alike = new Map<string, ObservableWindow[]>()
  const rows = named.flatMap(({ name, site, facts }) => {
    const key = JSON.stringify([site.siteId, facts.horizon, facts.highestAltitudeDeg])
    const windows =
      alike.get(key) ??
      (most === 0 ? [] : windowsOf({ site, telescope: facts }, asked.POS, range.fromMjd, range.toMjd)).filter(
        ({ startMjd, stopMjd }) => (stopMjd - startMjd) * 86_400 >= asked.MIN_OBS,
      )
    alike.set(key, windows)
    return windows.map((window) => ({ ...window, facility: name }))
  })
  rows.sort((a, b) => a.startMjd - b.startMjd)
  return {
    asked,
    engine: skyEngineVersion,
    ...range,
    rows: rows.slice(0, most),
    // Nothing is computed for no rows; DALI 1.1, section 3.4.4, has that told as an overflow too.
    isOverflow: most === 0 || rows.length > most,
  }
}
