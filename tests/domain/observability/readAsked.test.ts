import { describe, expect, it } from 'vitest'
import { readAsked } from '@/lib/domain/observability/readAsked'
import { Refusal } from '@/lib/errors'

const read = (query: string) => readAsked(new URLSearchParams(query))

function refused(query: string): Refusal {
  try {
    read(query)
  } catch (error) {
    if (error instanceof Refusal) return error
    throw error
  }
  return expect.fail('it was not refused')
}

describe('a query of the virtual observatory', () => {
  it('is read by names in any case; unknown names and empty values are left aside', () => {
    expect(
      read('pos=52,-27.8&Time=61430/61432.5&maxrec=5&min_obs=600&Facility=Aldous&FOO=1&__proto__=2'),
    ).toEqual({
      POS: { raDeg: 52, decDeg: -27.8 },
      TIME: { fromMjd: 61430, toMjd: 61432.5 },
      MAXREC: 5,
      MIN_OBS: 600,
      FACILITY: 'Aldous',
      RESPONSEFORMAT: { kind: 'votable', mediaType: 'application/x-votable+xml' },
    })
    expect(read('POS=360,90&TIME=&MAXREC=')).toMatchObject({
      POS: { raDeg: 0, decDeg: 90 },
      TIME: { fromMjd: null, toMjd: null },
      MIN_OBS: 0,
    })
  })

  it.each([
    ['61430/61431', 61430, 61431],
    ['/61431', null, 61431],
    ['61430/', 61430, null],
    ['6.143e4/6.2e4', 61430, 62000],
  ])('has a TIME of %s', (time, fromMjd, toMjd) => {
    expect(read(`POS=1,2&TIME=${time}`).TIME).toEqual({ fromMjd, toMjd })
  })

  it.each([
    ['votable', 'votable', 'application/x-votable+xml'],
    ['VOTable', 'votable', 'application/x-votable+xml'],
    ['application/x-votable%2Bxml;serialization=tabledata', 'votable', 'application/x-votable+xml'],
    ['text/xml', 'votable', 'text/xml'],
    ['csv', 'csv', 'text/csv'],
    ['text/csv;header=present', 'csv', 'text/csv'],
  ])('is answered to RESPONSEFORMAT %s', (format, kind, mediaType) => {
    expect(read(`POS=1,2&RESPONSEFORMAT=${format}`).RESPONSEFORMAT).toEqual({ kind, mediaType })
  })

  it.each([
    ['', 'POS'],
    ['POS=', 'POS'],
    ['POS=NaN,1', 'POS'],
    ['POS=1,1e999', 'POS'],
    ['POS=1', 'POS'],
    ['POS=1,2,ICRS', 'POS'],
    ['POS=361,0', 'POS'],
    ['POS=1,91', 'POS'],
    ['POS=-1,0', 'POS'],
    ['POS=1,2&pos=1,2', 'POS'],
    ['POS=1,2&TIME=61430', 'TIME'],
    ['POS=1,2&TIME=61431/61430', 'TIME'],
    ['POS=1,2&TIME=61430/61431,61440/61441', 'TIME'],
    ['POS=1,2&TIME=0/61431', 'TIME'],
    ['POS=1,2&TIME=61430/1e9', 'TIME'],
    ['POS=1,2&MAXREC=-1', 'MAXREC'],
    ['POS=1,2&MAXREC=1.5', 'MAXREC'],
    ['POS=1,2&MIN_OBS=Infinity', 'MIN_OBS'],
    ['POS=1,2&RESPONSEFORMAT=fits', 'RESPONSEFORMAT'],
  ])('is refused for %j at %s', (query, field) => {
    expect(Object.keys(refused(query).fieldErrors)).toEqual([field])
  })

  it('is refused with every sentence at once', () => {
    expect(refused('POS=1,91&MAXREC=x').message).toBe(
      'The declination of POS lies between -90 and 90 degrees. MAXREC is a whole number, 0 or more.',
    )
  })
})
