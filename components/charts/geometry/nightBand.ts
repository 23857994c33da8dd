import type { Night } from '@/lib/science/sky'

const minute = 60_000
const hour = 3_600_000
const marginMs = 14 * minute
const stopCount = 32

export interface BandTick {
  /** Where on the band, 0 to 1. */
  share: number
  /** Even hours of UTC carry their name. */
  name: string | null
}

export interface NightBandGeometry {
  fromMs: number
  toMs: number
  stops: { share: number; sunAltitudeDeg: number }[]
  moonBars: { from: number; to: number }[]
  moonThickness: number
  ticks: BandTick[]
}

const clamp = (value: number) => Math.min(1, Math.max(0, value))

/** Where a night without sunset (or without sunrise) is cut: twelve hours about its middle, 18:00 to 06:00. */
function edges(night: Night, utcOffsetHours: number): [number, number] {
  const evening = Date.parse(`${night.date}T18:00:00Z`) - utcOffsetHours * hour
  return [
    (night.sunset?.getTime() ?? evening) - marginMs,
    (night.sunrise?.getTime() ?? evening + 12 * hour) + marginMs,
  ]
}

/**
 * The night laid out on a line from 0 to 1, linear in time, from 14 minutes before sunset to 14 after sunrise.
 * `sunAltitudeDegAt` is the Sun's altitude at the site for an instant.
 */
export function nightBandGeometry(
  night: Night,
  utcOffsetHours: number,
  sunAltitudeDegAt: (at: Date) => number,
): NightBandGeometry {
  const [fromMs, toMs] = edges(night, utcOffsetHours)
  const share = (ms: number) => (ms - fromMs) / (toMs - fromMs)
  const stops = Array.from({ length: stopCount }, (_, index) => {
    const at = index / (stopCount - 1)
    return { share: at, sunAltitudeDeg: sunAltitudeDegAt(new Date(fromMs + at * (toMs - fromMs))) }
  })
  const moonBars = night.moonUp
    .map(([rise, set]) => ({ from: clamp(share(rise.getTime())), to: clamp(share(set.getTime())) }))
    .filter(({ from, to }) => to > from)
  const dusk = night.eveningTwilight.astronomical?.getTime()
  const dawn = night.morningTwilight.astronomical?.getTime()
  return {
    fromMs,
    toMs,
    stops,
    moonBars,
    moonThickness: Math.max(1, 5 * night.moonIllumination),
    ticks: dusk === undefined || dawn === undefined ? [] : hourTicks(dusk, dawn, share),
  }
}

function hourTicks(dusk: number, dawn: number, share: (ms: number) => number): BandTick[] {
  const ticks: BandTick[] = []
  for (let ms = Math.ceil(dusk / hour) * hour; ms <= dawn; ms += hour) {
    const utcHour = new Date(ms).getUTCHours()
    ticks.push({ share: share(ms), name: utcHour % 2 === 0 ? String(utcHour).padStart(2, '0') : null })
  }
  return ticks
}
