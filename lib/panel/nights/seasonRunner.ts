import type { SeasonPlan } from './seasonTypes'

interface Entry {
  part: number
  /** Share of a piece that the part can use. */
  share: number
  /** Seconds the plan laid in the bin. */
  laid: number
}

/** Shorter than this is nothing: seconds are shared in fractions. */
const nothing = 1e-6

/**
 * Runs a plan through seasons, night by night, knowing no night before it comes. Dark time of a clear night goes to those
 * the plan laid in its bin, in their order, as far as laid there; what they leave goes, in the same order, to whoever
 * can use it and still lacks time. A lost night gives nothing.
 */
export class SeasonRunner {
  private readonly byBin = new Map<number, Entry[]>()
  /** The award of each part. */
  private readonly award: number[] = []
  private readonly wanted: number[] = []

  constructor(private readonly plan: SeasonPlan) {
    plan.awards.forEach(({ parts }, award) => {
      for (const { seconds, laid, share } of parts) {
        const part = this.award.push(award) - 1
        this.wanted.push(seconds)
        for (const [bin, own] of share) {
          const entries = this.byBin.get(bin) ?? []
          entries.push({ part, share: own, laid: laid.get(bin) ?? 0 })
          this.byBin.set(bin, entries)
        }
      }
    })
  }

  /** Seconds observed of each award in a season with these nights lost. */
  run(lost: Uint8Array): Float64Array {
    const lacks = Float64Array.from(this.wanted)
    const laid = new Map([...this.byBin].map(([bin, entries]) => [bin, entries.map((entry) => entry.laid)]))
    for (const { night, bin, seconds } of this.plan.pieces) {
      const entries = this.byBin.get(bin)
      if (lost[night] || !entries) continue
      this.serve(entries, laid.get(bin) ?? [], seconds, lacks)
    }
    const observed = new Float64Array(this.plan.awards.length)
    this.award.forEach((award, part) => {
      observed[award] = (observed[award] ?? 0) + (this.wanted[part] ?? 0) - (lacks[part] ?? 0)
    })
    return observed
  }

  /** Shares one piece out: first as planned, then to whoever can use the rest. */
  private serve(entries: readonly Entry[], laid: number[], seconds: number, lacks: Float64Array): void {
    let left = seconds
    const took = new Float64Array(entries.length)
    for (const asPlanned of [true, false])
      for (let at = 0; at < entries.length && left > nothing; at += 1) {
        const { part, share } = entries[at] as Entry
        const most = Math.min(left, lacks[part] ?? 0, share * seconds - (took[at] ?? 0))
        const now = asPlanned ? Math.min(most, laid[at] ?? 0) : most
        if (now <= 0) continue
        took[at] = (took[at] ?? 0) + now
        if (asPlanned) laid[at] = (laid[at] ?? 0) - now
        lacks[part] = (lacks[part] ?? 0) - now
        left -= now
      }
  }
}
