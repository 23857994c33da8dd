import { createChebyshevBasis } from '../numeric/chebyshevFit'
import { slot } from '../numeric/slot'

/**
 * Even pieces within each doubling of 1 + z, so that the piece of a redshift is found by a shift and not by a
 * search. 1/E has its nearest singularity, a complex zero of E^2, at a distance of order 1 + z: on a piece a
 * sixteenth of that wide ten terms are exact to rounding.
 */
export const PIECES_PER_OCTAVE = 16
const OCTAVES = 11
export const PIECES = PIECES_PER_OCTAVE * OCTAVES

export const basis = createChebyshevBasis(10)

/** Error, in units of the integrand, below which a piece is taken; above, it is left to the slower way. */
const CONVERGED = 2e-13

const octaveOf = (i: number): number => 2 ** Math.floor(i / PIECES_PER_OCTAVE)
const widths = Float64Array.from({ length: PIECES }, (_, i) => octaveOf(i) / PIECES_PER_OCTAVE)
const lows = Float64Array.from(
  { length: PIECES },
  (_, i) => octaveOf(i) * (1 + (i % PIECES_PER_OCTAVE) / PIECES_PER_OCTAVE) - 1,
)
/** Every node of every piece, in z. */
const places = Float64Array.from({ length: PIECES * basis.order }, (_, index) => {
  const i = Math.floor(index / basis.order)
  return slot(lows, i) + slot(widths, i) * slot(basis.nodes, index % basis.order)
})

/** Width of a piece, in z. Exact. */
export const pieceWidth = (i: number): number => slot(widths, i)

/** Low end of a piece, in z. Exact. */
export const pieceLow = (i: number): number => slot(lows, i)

/** f at the nodes of every piece that lies before `end`, NaN at the others. */
export function valuesOnPieces(f: (z: number) => number, end: number): Float64Array {
  const values = new Float64Array(PIECES * basis.order).fill(NaN)
  for (let i = 0; i < PIECES && pieceLow(i) + pieceWidth(i) <= end; i += 1) {
    for (let j = i * basis.order; j < (i + 1) * basis.order; j += 1) values[j] = f(slot(places, j))
  }
  return values
}

/** Values on pieces, each over its 1 + z: the integrand of time from that of distance. */
export function overOnePlusZ(values: Float64Array): Float64Array {
  return values.map((value, index) => value / (1 + slot(places, index)))
}

/**
 * Mean of an integrand from the low end of each piece, as a polynomial: the integral up to t is t times it.
 * Of a piece that does not converge, or where there is nothing, every coefficient is NaN.
 */
export function meansOnPieces(values: Float64Array): Float64Array {
  const means = new Float64Array(PIECES * basis.order).fill(NaN)
  for (let i = 0; i < PIECES; i += 1) {
    const offset = i * basis.order
    if (Number.isNaN(slot(values, offset))) break
    const { coefficients, tail, largest } = basis.through(values, offset)
    if (!(tail <= CONVERGED * largest)) continue
    for (let j = 0; j < basis.order; j += 1) means[offset + j] = slot(coefficients, j) / (j + 1)
  }
  return means
}

/**
 * Running integral from z = 0 at the low end of each piece before `end`: the sum of the pieces, and past one
 * that did not converge what `slowly` gives.
 */
export function startsOfPieces(
  means: Float64Array,
  end: number,
  slowly: (z: number) => number,
): (i: number) => number {
  const starts = new Float64Array(PIECES)
  let sum = 0
  for (let i = 0; i < PIECES && pieceLow(i) + pieceWidth(i) <= end; i += 1) {
    starts[i] = sum
    let mean = 0
    for (let j = 0; j < basis.order; j += 1) mean += slot(means, i * basis.order + j)
    sum = Number.isNaN(mean) ? slowly(pieceLow(i) + pieceWidth(i)) : sum + pieceWidth(i) * mean
  }
  return (i) => slot(starts, i)
}
