import type { AskedLine, NightsPolicy } from './types'

const tenthOfAnHour = 360

/**
 * By rank, then fill. In turn each proposal above the line takes what it asks, or what is left on the telescope where
 * that is not less than its least useful award; then those below the line fill what remains, in the same way.
 * A proposal on several instruments is given time on all of them or on none.
 */
export const byRankThenFill: NightsPolicy = ({ asked, offered }) => {
  const left = new Map(offered)
  const given: ReturnType<NightsPolicy>['given'] = []
  const notGiven: ReturnType<NightsPolicy>['notGiven'] = []
  const fits = (line: AskedLine, room: number): number => {
    if (line.seconds <= room) return line.seconds
    const part = Math.floor(room / tenthOfAnHour) * tenthOfAnHour
    return part >= line.least ? part : 0
  }
  // Ranking order puts those above the line first, so one pass is both steps.
  for (const lines of asked) {
    const room = new Map(left)
    const taken: { line: AskedLine; seconds: number }[] = []
    for (const line of lines) {
      const free = room.get(line.telescope) ?? 0
      const seconds = line.possible ? fits(line, free) : 0
      if (seconds === 0) continue
      room.set(line.telescope, free - seconds)
      taken.push({ line, seconds })
    }
    if (taken.length === lines.length) {
      for (const { line, seconds } of taken) {
        left.set(line.telescope, (left.get(line.telescope) ?? 0) - seconds)
        given.push({
          proposal: line.proposal,
          instrument: line.instrument,
          telescope: line.telescope,
          seconds,
        })
      }
      continue
    }
    const stopped = lines.filter((line) => !taken.some((one) => one.line === line))
    for (const line of stopped)
      notGiven.push({
        proposal: line.proposal,
        instrument: line.instrument,
        reason: line.possible ? 'too-little-left' : 'not-possible',
        left: room.get(line.telescope) ?? 0,
      })
  }
  return { given, notGiven }
}
