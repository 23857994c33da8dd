import type { BinnedLine, NightBin } from '../../lib/panel/nights/binTypes'
import { byRankInBins } from '../../lib/panel/nights/byRankInBins'
import { laidAwards } from '../../lib/panel/nights/laidAwards'
import { mostMeritInBins } from '../../lib/panel/nights/mostMeritInBins'
import { simulateSeasons } from '../../lib/panel/nights/simulateSeasons'
import { seededUniform } from '../../lib/panel/random'
import { solveInWorker } from '../../lib/services/solver/solveInWorker'
import { sayTime } from './measure'
import { reportText } from './report'

const hour = 3600
const moons = ['dark', 'grey', 'bright'] as const

/** Four telescopes through twelve half-months, five pieces of sidereal time a night, three classes of moonlight. */
function season(random: () => number): NightBin[] {
  return Array.from({ length: 4 * 12 * 5 * 3 }, (_, i): NightBin => {
    const half = Math.floor(i / 15) % 12
    return {
      telescope: 1 + Math.floor(i / 180),
      half,
      siderealFromH: (2 * (Math.floor(i / 3) % 5) + half) % 24,
      moon: moons[i % 3] ?? 'dark',
      seconds: Math.round((4 + random() * 12) * hour),
    }
  })
}

/** A proposal of two targets, each up for some eight hours of sidereal time, half of them whatever the Moon. */
function request(random: () => number, bins: readonly NightBin[], proposal: number): BinnedLine[] {
  const telescope = 1 + Math.floor(random() * 4)
  const parts = [0, 1].map(() => {
    const top = Math.floor(random() * 12)
    const usable = bins.flatMap((bin, at): [number, number][] => {
      const away = Math.abs(((bin.siderealFromH / 2 - top + 18) % 12) - 6)
      const isUp = bin.telescope === telescope && away <= 2 && (bin.moon === 'dark' || random() < 0.5)
      return isUp ? [[at, Math.round(bin.seconds * (0.3 + 0.7 * random()))]] : []
    })
    return { seconds: Math.round((2 + random() * 15) * 10) * 360, usable: new Map(usable) }
  })
  const seconds = parts.reduce((sum, part) => sum + part.seconds, 0)
  return [{ proposal, instrument: telescope, telescope, seconds, least: seconds / 2, possible: true, parts }]
}

const random = seededUniform(7)
const bins = season(random)
const asked = Array.from({ length: 500 }, (_, proposal) => request(random, bins, proposal))
const merit = new Map(asked.map((_, proposal) => [proposal, 9 - proposal / 100]))

const started = performance.now()
const byRank = byRankInBins(asked, bins)
reportText(
  `nights for 500 proposals in ${bins.length} bins, by rank`,
  sayTime((performance.now() - started) / 1000),
  `${byRank.given.length} given, exact`,
)

const begun = performance.now()
const input = { asked, line: asked.length, bins, standing: [], merit }
const byMerit = await mostMeritInBins(input, solveInWorker, { seconds: 60, relativeGap: 0.001 })
reportText(
  'the same for most merit',
  sayTime((performance.now() - begun) / 1000),
  'why' in byMerit
    ? byMerit.why
    : `${byMerit.given.length} given, ${(100 * (1 - byMerit.meritHours / byMerit.boundMeritHours)).toFixed(2)} % from the bound`,
)

/** Every half-month's fifteen evenings hold an even part of each of its bins, telescope by telescope. */
const pieces = Array.from({ length: 12 * 15 }, (_, night) =>
  bins.flatMap(({ half, seconds }, bin) =>
    half === Math.floor(night / 15) ? [{ night, bin, seconds: seconds / 15 }] : [],
  ),
).flat()
const { awards } = laidAwards(
  asked.flatMap((lines) => lines.map((line) => ({ ...line, least: 0 }))),
  bins,
  [],
)
const start = performance.now()
const seasons = 1000
const plan = { lost: Array.from({ length: 180 }, () => 0.25), persistence: 0.35, pieces, awards }
const outlook = simulateSeasons(plan, { seed: 7, seasons })
reportText(
  `${awards.length} awards through ${seasons} seasons of weather, ${pieces.length} pieces of dark time each`,
  sayTime((performance.now() - start) / 1000),
  `${outlook.filter(({ chance }) => chance > 0.5).length} more likely finished than not`,
)
