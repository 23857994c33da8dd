/** x' = a x + c y + e, y' = b x + d y + f, as in SVG. */
export type Matrix = readonly [a: number, b: number, c: number, d: number, e: number, f: number]

export const identity: Matrix = [1, 0, 0, 1, 0, 0]

/** First `inner`, then `outer`. */
export function times(outer: Matrix, inner: Matrix): Matrix {
  const [a, b, c, d, e, f] = outer
  const [p, q, r, s, t, u] = inner
  return [a * p + c * q, b * p + d * q, a * r + c * s, b * r + d * s, a * t + c * u + e, b * t + d * u + f]
}

/** `translate(1,2) scale(3)` and `matrix(...)` as one matrix. */
export function matrixOf(transform: string | undefined): Matrix {
  let all = identity
  for (const [, name, inside = ''] of (transform ?? '').matchAll(/(\w+)\(([^)]*)\)/g)) {
    const [x = 0, y, ...rest] = inside
      .split(/[\s,]+/)
      .filter(Boolean)
      .map(Number)
    if (name === 'translate') all = times(all, [1, 0, 0, 1, x, y ?? 0])
    else if (name === 'scale') all = times(all, [x, 0, 0, y ?? x, 0, 0])
    else if (name === 'matrix' && rest.length === 4)
      all = times(all, [x, y ?? 0, rest[0] ?? 0, rest[1] ?? 0, rest[2] ?? 0, rest[3] ?? 0])
    else throw new Error(`a transform of another kind: ${name ?? ''}`)
  }
  return all
}

export type Point = readonly [x: number, y: number]
/** A stroke of an outline with its points, absolute. */
export type Segment = readonly [command: 'M' | 'L' | 'Q' | 'C' | 'Z', points: readonly Point[]]

const counts: Readonly<Record<string, number>> = { M: 2, L: 2, H: 1, V: 1, Q: 4, T: 2, C: 6, Z: 0 }

/** Path data in absolute commands as segments. Glyph outlines use no others. */
export function segmentsOf(data: string): Segment[] {
  const tokens = data.match(/[a-z]|-?\d*\.?\d+/gi) ?? []
  const segments: Segment[] = []
  let at: Point = [0, 0]
  let control: Point | null = null
  let command = ''
  for (let index = 0; index < tokens.length;) {
    const token = tokens[index] ?? ''
    if (/[a-z]/i.test(token)) {
      command = token
      index += 1
    }
    const count = counts[command]
    if (count === undefined) throw new Error(`a stroke of another kind: ${command}`)
    const n = tokens.slice(index, index + count).map(Number)
    index += count
    const point = (i: number): Point => [n[i] ?? 0, n[i + 1] ?? 0]
    const reflected: Point = control ? [2 * at[0] - control[0], 2 * at[1] - control[1]] : at
    let segment: Segment
    if (command === 'Z') segment = ['Z', []]
    else if (command === 'H') segment = ['L', [[n[0] ?? 0, at[1]]]]
    else if (command === 'V') segment = ['L', [[at[0], n[0] ?? 0]]]
    else if (command === 'Q') segment = ['Q', [point(0), point(2)]]
    else if (command === 'T') segment = ['Q', [reflected, point(0)]]
    else if (command === 'C') segment = ['C', [point(0), point(2), point(4)]]
    else segment = [command === 'M' ? 'M' : 'L', [point(0)]]
    segments.push(segment)
    control = segment[0] === 'Q' ? (segment[1][0] ?? null) : null
    at = segment[1].at(-1) ?? at
    if (command === 'Z' && /\d/.test(tokens[index] ?? ''))
      throw new Error('numbers after the end of a stroke')
    // Further pairs after a move are lines.
    if (command === 'M') command = 'L'
  }
  return segments
}

export function moved(segments: readonly Segment[], [a, b, c, d, e, f]: Matrix): Segment[] {
  return segments.map(([command, points]) => [
    command,
    points.map(([x, y]) => [a * x + c * y + e, b * x + d * y + f] as const),
  ])
}

const short = (value: number) => String(Math.round(value * 10) / 10)

export function pathOf(segments: readonly Segment[]): string {
  return segments
    .map(([command, points]) => command + points.map(([x, y]) => `${short(x)} ${short(y)}`).join(' '))
    .join('')
}
