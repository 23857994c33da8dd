import { describe, expect, it } from 'vitest'
import { seasonWeather } from '@/lib/domain/nights/seasonWeather'

// Seen to fail with the half-months counted from the first of the month, and with the share tried added to the record's.

const weather = {
  lostByMonth: [0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.6, 0.5, 0.4, 0.3, 0.2, 0.1],
  persistence: 0.35,
}
const season = { from: '2027-07-20', to: '2027-08-17' }

describe('the weather of a season', () => {
  it('is that of each evening’s month, and of each half-month from the first one on', () => {
    const found = seasonWeather(weather, season)
    expect(found.lost).toHaveLength(29)
    expect(found.lost.slice(10, 14)).toEqual([0.6, 0.6, 0.5, 0.5])
    expect(found.lostByHalf).toEqual([0.6, 0.5, 0.5])
    expect(found.persistence).toBe(0.35)
  })

  it('runs over the end of a year', () => {
    const { lost, lostByHalf } = seasonWeather(weather, { from: '2027-12-31', to: '2028-02-01' })
    expect([lost[0], lost[1], lost.at(-1)]).toEqual([0.1, 0.1, 0.2])
    expect(lostByHalf).toEqual([0.1, 0.1, 0.1, 0.2])
  })

  it('is even where a share is tried, and none where nothing is on record', () => {
    expect(seasonWeather(weather, season, 0.25).lostByHalf).toEqual([0.25, 0.25, 0.25])
    expect(seasonWeather(null, season)).toMatchObject({ lostByHalf: [0, 0, 0], persistence: 0 })
  })
})
