import { parseDeclination, parseRightAscension } from '@/lib/science/sky'

/** A position as typed, as a target of the sky engine; null where it cannot be read. */
export function positionOf(asked: { ra: string; dec: string }) {
  const ra = parseRightAscension(asked.ra)
  const dec = parseDeclination(asked.dec)
  return {
    id: 0,
    raDeg: ra.ok ? ra.deg : null,
    decDeg: dec.ok ? dec.deg : null,
    epochYr: 2000,
    pmRaMasYr: null,
    pmDecMasYr: null,
  }
}
