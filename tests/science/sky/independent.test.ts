import { describe, expect, it } from 'vitest'
import { nightAt, positionsAt, visibility } from '../../../lib/science/sky'
import { secondsApart } from '../support/seconds'
import { place, sky } from '../support/skyFixture'

/**
 * Independent code: tests/reference/sky.py, Astropy's own ephemerides and Earth orientation. What is
 * promised: altitudes 0.02 deg, Moon 0.05 deg, twilights 30 s, window edges 60 s. UTC stands for UT1 here,
 * which alone is up to 0.004 deg or 0.9 s.
 * Seen to fail: without aberration in x, or with a geocentric Moon (20 rows).
 */
describe(`independent code: ${sky.source}`, () => {
  it('has every row', () => {
    expect([sky.positions.length, sky.nights.length, sky.windows.length]).toEqual([32, 32, 192])
  })

  it.each(sky.positions)('positions at $site, $at', (row) => {
    const [found] = positionsAt({ site: place(row.site), targets: sky.targets, instants: [new Date(row.at)] })
    if (!found) throw new Error('No instant came back')
    expect(Math.abs(found.sunAltitudeDeg - row.sunAltitudeDeg)).toBeLessThan(0.005)
    expect(Math.abs(found.moonAltitudeDeg - row.moonAltitudeDeg)).toBeLessThan(0.01)
    expect(Math.abs(found.moonIllumination - row.moonIllumination)).toBeLessThan(5e-4)
    expect(Math.abs(found.lastHours - row.lastHours)).toBeLessThan(0.9 / 3600 + 1e-5)
    for (const [i, expected] of row.targets.entries()) {
      const target = found.targets[i]
      expect(target?.id).toBe(expected.id)
      if (!target) continue
      expect(Math.abs(target.altitudeDeg - expected.altitudeDeg)).toBeLessThan(0.005)
      const turn = Math.abs(target.azimuthDeg - expected.azimuthDeg)
      const azimuth = Math.min(turn, 360 - turn) * Math.cos((expected.altitudeDeg * Math.PI) / 180)
      expect(azimuth).toBeLessThan(0.005)
      expect(Math.abs(target.moonSeparationDeg - expected.moonSeparationDeg)).toBeLessThan(0.015)
      expect(Math.abs(target.sunSeparationDeg - expected.sunSeparationDeg)).toBeLessThan(0.01)
    }
  })

  it.each(sky.nights)('night of $date at $site', (row) => {
    const night = nightAt(place(row.site), row.date)
    const pairs: [Date | null, string | null][] = [
      [night.sunset, row.sunset.evening],
      [night.sunrise, row.sunset.morning],
      [night.eveningTwilight.civil, row.civil.evening],
      [night.morningTwilight.civil, row.civil.morning],
      [night.eveningTwilight.nautical, row.nautical.evening],
      [night.morningTwilight.nautical, row.nautical.morning],
      [night.eveningTwilight.astronomical, row.astronomical.evening],
      [night.morningTwilight.astronomical, row.astronomical.morning],
    ]
    for (const [found, expected] of pairs) {
      if (expected === null) expect(found).toBeNull()
      else expect(found && secondsApart(found, expected)).toBeLessThan(30)
    }
    expect(Math.abs(night.moonIllumination - row.moonIllumination)).toBeLessThan(5e-4)
    // A stretch with the Moon up starts with a rise or at sunset, and ends with a set or at sunrise.
    const starts = row.moonEdges.filter((edge) => edge.rising).map((edge) => edge.at)
    const ends = row.moonEdges.filter((edge) => !edge.rising).map((edge) => edge.at)
    for (const [from, to] of night.moonUp) {
      const begun = [...starts, row.sunset.evening ?? row.date].some((at) => secondsApart(from, at) < 30)
      const ended = [...ends, row.sunset.morning ?? row.date].some((at) => secondsApart(to, at) < 30)
      expect([begun, ended]).toEqual([true, true])
    }
  })

  it.each(sky.windows)('window of $id at $site on $date', (row) => {
    const site = place(row.site)
    const target = sky.targets.find(({ id }) => id === row.id)
    if (!target) throw new Error(`No target ${row.id}`)
    const asked = { site, targets: [target], from: row.date, to: row.date, maxAirmass: sky.maxAirmass }
    const { nights, targets } = visibility(asked)
    const [night] = nights
    const windows = targets[0]?.windows[0] ?? []
    const edges = row.edges.map((edge) => edge.at)
    for (const [from, to] of windows) {
      const start = [...edges, night?.darkFrom?.toISOString() ?? ''].some((at) => secondsApart(from, at) < 60)
      const end = [...edges, night?.darkTo?.toISOString() ?? ''].some((at) => secondsApart(to, at) < 60)
      expect(start, `start ${from.toISOString()}`).toBe(true)
      expect(end, `end ${to.toISOString()}`).toBe(true)
    }
    // Every edge in the dark is an edge of a window.
    for (const at of edges) {
      const dark =
        night?.darkFrom && night.darkTo && new Date(at) > night.darkFrom && new Date(at) < night.darkTo
      if (dark) expect(windows.flat().some((edge) => secondsApart(edge, at) < 60)).toBe(true)
    }
  })
})
