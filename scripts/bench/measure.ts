/** Best of several runs, seconds of processor time, so that a busy machine does not matter. */
export function measure(run: () => void, runs = 5): number {
  run()
  let best = Infinity
  for (let i = 0; i < runs; i += 1) {
    const start = process.cpuUsage()
    run()
    const { user, system } = process.cpuUsage(start)
    best = Math.min(best, (user + system) / 1e6)
  }
  return best
}

/** A time with a unit that suits it. */
export function sayTime(seconds: number): string {
  if (seconds < 1e-6) return `${(seconds * 1e9).toFixed(0)} ns`
  if (seconds < 1e-3) return `${(seconds * 1e6).toFixed(1)} µs`
  return seconds < 1 ? `${(seconds * 1e3).toFixed(2)} ms` : `${seconds.toFixed(2)} s`
}
