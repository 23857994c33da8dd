/**
 * A linear or mixed-integer programme to be maximised: `objective · x` with `lower <= x <= upper` and, for each row,
 * `rowLower <= A x <= rowUpper`. The matrix is kept by rows: row `i` has the entries `starts[i]` to `starts[i + 1]`.
 * A side without a bound is infinite.
 */
export interface Programme {
  objective: Float64Array
  lower: Float64Array
  upper: Float64Array
  /** 1 where the column must be a whole number. */
  isInteger: Int32Array
  rowLower: Float64Array
  rowUpper: Float64Array
  starts: Int32Array
  indices: Int32Array
  values: Float64Array
  /** A point to start from, one value a column; it need not meet every condition. */
  start?: Float64Array
}

export interface SolveLimits {
  /** After this long the best answer so far is given. */
  seconds: number
  /** Solving ends once (bound - objective) / objective is no more than this. */
  relativeGap: number
  /** Stops the solver at once; the answer is then `stopped`. */
  signal?: AbortSignal
}

/**
 * What came of it. `optimal` is proven within the gap asked for; `unfinished` has run out of time, its `values` the
 * best found; `values` is null when nothing was found. `bound` is what no answer can exceed; `gap` is relative.
 */
export type Answer =
  | { status: 'optimal' | 'unfinished'; values: Float64Array; objective: number; bound: number; gap: number }
  | { status: 'infeasible' | 'unbounded' | 'stopped' | 'unfinished' | 'failed'; values: null; why: string }

/** The one way to a solver. Never rejects: a failure is an answer with a sentence. Same programme, same answer, unless time runs out. */
export type Solve = (programme: Programme, limits: SolveLimits) => Promise<Answer>
