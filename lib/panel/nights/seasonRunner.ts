import type { SeasonPlan } from './seasonTypes'

/** Shorter than this is nothing: seconds are shared in fractions. */
const nothing = 1e-6

/**
 * Runs a plan through seasons, night by night, knowing no night before it comes. Dark time of a clear night goes to those
 * the plan laid in its bin, in their order, as far as laid there; what they leave goes, in the same order, to whoever
 * can use it and still lacks time. A lost night gives nothing. Kept in flat arrays: the loop of a season runs over
 * every part in every stretch of dark time.
 */
export class SeasonRunner {
  /** The award of each part, and the seconds it wants. */
  private readonly award: Int32Array
  private readonly wanted: Float64Array
  /** Entries of a bin are `starts[bin]` to `starts[bin + 1]`, in order of their parts. */
  private readonly starts: Int32Array
  private readonly part: Int32Array
  private readonly share: Float64Array
  private readonly planned: Float64Array
  /** What changes while a season runs. */
  private readonly lacks: Float64Array
  private readonly laid: Float64Array
  private readonly took: Float64Array

  constructor(private readonly plan: SeasonPlan) {
    const parts = plan.awards.flatMap(({ parts: own }, award) => own.map((part) => ({ ...part, award })))
    const bins = 1 + plan.pieces.reduce((most, { bin }) => Math.max(most, bin), -1)
    const inBin = Array.from({ length: bins }, (): number[] => [])
    parts.forEach(({ share }, part) => {
      for (const bin of share.keys()) inBin[bin]?.push(part)
    })
    this.award = Int32Array.from(parts, ({ award }) => award)
    this.wanted = Float64Array.from(parts, ({ seconds }) => seconds)
    this.starts = new Int32Array(bins + 1)
    inBin.forEach((own, bin) => (this.starts[bin + 1] = (this.starts[bin] ?? 0) + own.length))
    const entries = inBin.flatMap((own, bin) => own.map((part) => ({ part, bin })))
    this.part = Int32Array.from(entries, ({ part }) => part)
    this.share = Float64Array.from(entries, ({ part, bin }) => parts[part]?.share.get(bin) ?? 0)
    this.planned = Float64Array.from(entries, ({ part, bin }) => parts[part]?.laid.get(bin) ?? 0)
    this.lacks = new Float64Array(parts.length)
    this.laid = new Float64Array(entries.length)
    this.took = new Float64Array(entries.length)
  }

  /** Seconds observed of each award in a season with these nights lost. */
  run(lost: Uint8Array): Float64Array {
    this.lacks.set(this.wanted)
    this.laid.set(this.planned)
    for (const { night, bin, seconds } of this.plan.pieces) {
      if (lost[night]) continue
      const left = this.asPlanned(bin, seconds)
      if (left > nothing) this.toWhoCan(bin, seconds, left)
    }
    const observed = new Float64Array(this.plan.awards.length)
    this.award.forEach((award, part) => {
      observed[award] = (observed[award] ?? 0) + (this.wanted[part] ?? 0) - (this.lacks[part] ?? 0)
    })
    return observed
  }

  /** Shares a piece out as far as the plan laid it, and gives the seconds left. */
  private asPlanned(bin: number, seconds: number): number {
    const { starts, part, share, lacks, laid, took } = this
    let left = seconds
    const end = starts[bin + 1] ?? 0
    for (let at = starts[bin] ?? 0; at < end; at += 1) {
      took[at] = 0
      const own = laid[at] ?? 0
      if (own <= 0) continue
      const whose = part[at] ?? 0
      const now = Math.min(left, lacks[whose] ?? 0, (share[at] ?? 0) * seconds, own)
      if (now <= 0) continue
      took[at] = now
      laid[at] = own - now
      lacks[whose] = (lacks[whose] ?? 0) - now
      left -= now
    }
    return left
  }

  /** Shares what is left of a piece out to whoever can use it. */
  private toWhoCan(bin: number, seconds: number, leftOver: number): void {
    const { starts, part, share, lacks, took } = this
    let left = leftOver
    const end = starts[bin + 1] ?? 0
    for (let at = starts[bin] ?? 0; at < end && left > nothing; at += 1) {
      const whose = part[at] ?? 0
      const lack = lacks[whose] ?? 0
      if (lack <= 0) continue
      const now = Math.min(left, lack, (share[at] ?? 0) * seconds - (took[at] ?? 0))
      if (now <= 0) continue
      lacks[whose] = lack - now
      left -= now
    }
  }
}
