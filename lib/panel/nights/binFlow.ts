import type { BinnedPart } from './binTypes'

interface Node {
  usable: ReadonlyMap<number, number>
  /** Bin to seconds laid there; never 0. */
  laid: Map<number, number>
}

/**
 * Time laid into bins, one part after the other. What an earlier part was given stands, but it is moved among
 * the bins it can use to make room: augmenting paths (Ford & Fulkerson 1956; breadth first, Edmonds & Karp
 * 1972), so a part finds all that can be found for it. Whole seconds.
 */
export class BinFlow {
  private readonly free: number[]
  private readonly nodes: Node[] = []
  private readonly holders: Set<number>[]

  constructor(seconds: readonly number[]) {
    this.free = [...seconds]
    this.holders = seconds.map(() => new Set())
  }

  /** Lays as much of a part as can be laid, and gives its number. */
  lay(part: BinnedPart): number {
    const node = this.nodes.push({ usable: part.usable, laid: new Map() }) - 1
    let wanted = part.seconds
    while (wanted > 0) {
      const moved = this.augment(node, wanted)
      if (moved === 0) break
      wanted -= moved
    }
    return node
  }

  laidOf(node: number): ReadonlyMap<number, number> {
    return this.nodes[node]?.laid ?? new Map()
  }

  secondsOf(node: number): number {
    let sum = 0
    for (const seconds of this.laidOf(node).values()) sum += seconds
    return sum
  }

  /** Takes seconds of a part back, the last bins first. */
  takeBack(node: number, seconds: number): void {
    let left = seconds
    for (const [bin, laid] of [...this.laidOf(node)].reverse()) {
      const part = Math.min(laid, left)
      this.change(node, bin, -part)
      this.free[bin] = (this.free[bin] ?? 0) + part
      left -= part
      if (left <= 0) return
    }
  }

  private change(node: number, bin: number, by: number): void {
    const { laid } = this.nodes[node] as Node
    const now = (laid.get(bin) ?? 0) + by
    if (now > 0) {
      laid.set(bin, now)
      this.holders[bin]?.add(node)
    } else {
      laid.delete(bin)
      this.holders[bin]?.delete(node)
    }
  }

  /** Follows one shortest path from a part to a bin with room, and moves what it carries. */
  private augment(from: number, most: number): number {
    // The bin a part was reached by, and the part a bin was reached from.
    const byBin = new Map<number, number>()
    const byNode = new Map<number, number>()
    const queue = [from]
    for (let at = 0; at < queue.length; at += 1) {
      const node = queue[at] as number
      const { usable, laid } = this.nodes[node] as Node
      for (const [bin, can] of usable) {
        if (byNode.has(bin) || can - (laid.get(bin) ?? 0) <= 0) continue
        byNode.set(bin, node)
        if ((this.free[bin] ?? 0) > 0) return this.follow(from, bin, most, byBin, byNode)
        for (const holder of this.holders[bin] ?? []) {
          if (holder === from || byBin.has(holder)) continue
          byBin.set(holder, bin)
          queue.push(holder)
        }
      }
    }
    return 0
  }

  private follow(
    from: number,
    end: number,
    most: number,
    byBin: ReadonlyMap<number, number>,
    byNode: ReadonlyMap<number, number>,
  ): number {
    const steps: { node: number; to: number; out: number | null }[] = []
    for (let bin: number | undefined = end; bin !== undefined;) {
      const node = byNode.get(bin) as number
      const out = node === from ? null : (byBin.get(node) as number)
      steps.push({ node, to: bin, out })
      bin = out ?? undefined
    }
    let moved = Math.min(most, this.free[end] ?? 0)
    for (const { node, to, out } of steps) {
      const { usable, laid } = this.nodes[node] as Node
      moved = Math.min(moved, (usable.get(to) ?? 0) - (laid.get(to) ?? 0))
      if (out !== null) moved = Math.min(moved, laid.get(out) ?? 0)
    }
    for (const { node, to, out } of steps) {
      if (out !== null) this.change(node, out, -moved)
      this.change(node, to, moved)
    }
    this.free[end] = (this.free[end] ?? 0) - moved
    return moved
  }
}
