import { describe, expect, it } from 'vitest'
import { wishLines } from '@/lib/domain/wishes/wishLines'
import { contents, observation, slitMode } from '../../support/contents'

const { instrument } = slitMode
const visit = { nights: 3, part: 'first', together: true } as const
const wish = { id: 1, instrumentId: instrument.id, leastSeconds: 5400, visit, version: 1 }
const lines = (over: Parameters<typeof contents>[0]) => wishLines(contents(over))

// Seen to fail with instruments told that nobody asks for, and with those told of which nothing is said.
describe('how time is wished for, in words', () => {
  it('is told instrument by instrument', () => {
    expect(lines({ wishes: [wish] })).toEqual([
      {
        instrument: instrument.name,
        visit: 'three first halves of nights in a row',
        least: expect.stringMatching(/^1\.5.h$/),
      },
    ])
    expect(lines({ wishes: [{ ...wish, visit: null }] })).toMatchObject([{ visit: null }])
  })

  it('is not told of an instrument that is not asked for, nor where nothing is said', () => {
    expect(lines({ wishes: [wish], observations: [] })).toEqual([])
    expect(lines({ wishes: [wish], observations: [observation({ modeId: 99 })] })).toEqual([])
    expect(lines({ wishes: [{ ...wish, visit: null, leastSeconds: null }] })).toEqual([])
    expect(lines({ wishes: [{ ...wish, instrumentId: instrument.id + 99 }] })).toEqual([])
  })
})
