import { at } from './at'

/** Nodes on [-1, 1] and weights of the Gauss-Legendre rule with n points, by Newton's method on P_n. */
export function gaussLegendre(n: number): { nodes: Float64Array; weights: Float64Array } {
  const nodes = new Float64Array(n)
  const weights = new Float64Array(n)
  for (let i = 0; i < n; i += 1) {
    let x = Math.cos((Math.PI * (i + 0.75)) / (n + 0.5))
    let slope = 1
    for (let iteration = 0; iteration < 100; iteration += 1) {
      let previous = 1
      let current = x
      for (let k = 2; k <= n; k += 1) {
        const next = ((2 * k - 1) * x * current - (k - 1) * previous) / k
        previous = current
        current = next
      }
      slope = (n * (x * current - previous)) / (x * x - 1)
      const step = current / slope
      x -= step
      if (Math.abs(step) < 1e-16) break
    }
    nodes[i] = x
    weights[i] = 2 / ((1 - x * x) * slope * slope)
  }
  return { nodes, weights }
}

const rule = gaussLegendre(20)

/** Integral of a smooth function over [low, high] with the 20-point Gauss-Legendre rule. */
export function integrate(f: (x: number) => number, low: number, high: number): number {
  const half = 0.5 * (high - low)
  const middle = 0.5 * (high + low)
  let sum = 0
  for (let i = 0; i < rule.nodes.length; i += 1) {
    sum += at(rule.weights, i) * f(middle + half * at(rule.nodes, i))
  }
  return sum * half
}
