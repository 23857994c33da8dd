import { dateOfMjd, mjdOf, visibility } from '@/lib/science/sky'
import { pointingOf } from '../facility/pointingOf'
import type { SiteRecord, TelescopePointing } from '../facility/types'

/** A stretch in which a position can be observed, modified Julian dates. */
export interface ObservableWindow {
  startMjd: number
  stopMjd: number
}

const day = 86_400_000
const second = 1 / 86_400

const dateBeside = (mjd: number, days: number) =>
  new Date(dateOfMjd(mjd).getTime() + days * day).toISOString().slice(0, 10)

/** Joins windows that touch: a night that lasts past noon is no two. */
function joined(windows: readonly ObservableWindow[]): ObservableWindow[] {
  const found: ObservableWindow[] = []
  for (const window of windows) {
    const last = found.at(-1)
    if (last && window.startMjd - last.stopMjd < second) last.stopMjd = window.stopMjd
    else found.push({ ...window })
  }
  return found
}

/**
 * When a position (ICRS, degrees) can be observed with a telescope between two modified Julian dates: the Sun 18
 * degrees under the horizon and the position where the telescope can point, above the lowest altitude of its site and
 * what stands around it, and outside its blind spot. Edges within 60 s.
 */
export function windowsOf(
  { site, telescope }: { site: SiteRecord; telescope?: TelescopePointing },
  position: { readonly raDeg: number; readonly decDeg: number },
  fromMjd: number,
  toMjd: number,
): ObservableWindow[] {
  const { targets } = visibility({
    site,
    targets: [{ id: 'asked', ...position }],
    // The night a moment falls in may carry the date before or after its own.
    from: dateBeside(fromMjd, -1),
    to: dateBeside(toMjd, 1),
    maxAirmass: 30,
    ...pointingOf(site, telescope),
  })
  const windows = (targets[0]?.windows ?? []).flat().map(([start, stop]) => ({
    startMjd: Math.max(mjdOf(start), fromMjd),
    stopMjd: Math.min(mjdOf(stop), toMjd),
  }))
  return joined(windows.filter(({ startMjd, stopMjd }) => stopMjd > startMjd))
}
