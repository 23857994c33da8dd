import { slot } from '../numeric/slot'
import { PIECES, pieceLow, pieceWidth } from './redshiftPieces'

/** A function of redshift made for many readings: some nanoseconds each, nothing allocated. */
export interface RedshiftTable {
  /** The value, or NaN where the table has none: past its end, on pieces that did not converge, for z < 0. */
  read(z: number): number
  /** Reads all of `redshifts` into `out`; where the table has no value, `otherwise` gives it or refuses. */
  fill(redshifts: Float64Array, out: Float64Array, otherwise: (z: number) => number): void
}

/** Low end, one over width, value at the low end, ten coefficients; padded to a power of two. */
const STRIDE = 16
const ORDER = 10
const END = 2047
/** Pieces of an octave, over the octave's size. */
const scales = Float64Array.from({ length: 32 }, (_, octave) => 16 / 2 ** octave)

/**
 * The one loop. It stands outside the closure and has its constants written out, because only so does it
 * compile to a few nanoseconds a redshift: numbers from elsewhere, and calls, make it five times as slow.
 */
function readAll(data: Float64Array, redshifts: Float64Array, out: Float64Array): number {
  let sum = 0
  for (let k = 0; k < redshifts.length; k += 1) {
    const z = slot(redshifts, k)
    if (!(z >= 0 && z < END)) {
      out[k] = NaN
      sum = NaN
      continue
    }
    const octave = 31 - Math.clz32(1 + z)
    const piece = (octave << 4) + (((1 + z) * slot(scales, octave)) | 0) - 16
    const i = piece << 4
    const d = z - slot(data, i)
    const t = d * slot(data, i + 1)
    // Horner by pairs: half the steps that wait for one another.
    const t2 = t * t
    let mean = slot(data, i + 12) * t + slot(data, i + 11)
    mean = mean * t2 + (slot(data, i + 10) * t + slot(data, i + 9))
    mean = mean * t2 + (slot(data, i + 8) * t + slot(data, i + 7))
    mean = mean * t2 + (slot(data, i + 6) * t + slot(data, i + 5))
    mean = mean * t2 + (slot(data, i + 4) * t + slot(data, i + 3))
    const value = slot(data, i + 2) + d * mean
    sum += value
    out[k] = value
  }
  return sum
}

/**
 * Table of a running integral F(z) = start(low) + sign (z - low) mean(t) on each piece, so that a reading next
 * to z = 0 keeps its full relative accuracy. `start` gives F at the low end of piece i, `means` come from
 * meansOnPieces; `sign` is -1 for what falls with redshift, as an age does.
 */
export function createRedshiftTable(
  means: Float64Array,
  start: (piece: number) => number,
  sign: 1 | -1,
): RedshiftTable {
  const data = new Float64Array(PIECES * STRIDE).fill(NaN)
  for (let i = 0; i < PIECES; i += 1) {
    if (Number.isNaN(slot(means, i * ORDER))) continue
    data.set([pieceLow(i), 1 / pieceWidth(i), start(i)], i * STRIDE)
    for (let j = 0; j < ORDER; j += 1) data[i * STRIDE + 3 + j] = sign * slot(means, i * ORDER + j)
  }
  const asked = new Float64Array(1)
  const answer = new Float64Array(1)
  return {
    read(z) {
      asked[0] = z
      readAll(data, asked, answer)
      return slot(answer, 0)
    },
    fill(redshifts, out, otherwise) {
      if (!Number.isNaN(readAll(data, redshifts, out))) return
      for (let k = 0; k < redshifts.length; k += 1) {
        if (Number.isNaN(slot(out, k))) out[k] = otherwise(slot(redshifts, k))
      }
    },
  }
}
