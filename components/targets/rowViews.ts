import { pointingOf } from '@/lib/domain/facility/rules'
import { conditionsOf, worstVerdict } from '@/lib/domain/observations/rules'
import type { ProposalComputation, TargetComputation } from '@/lib/domain/observations/types'
import type { ProposalContents, Target } from '@/lib/domain/proposals/types'
import { limitWords } from '@/lib/science/feasibility'
import type { RowView } from './targetTableTypes'

/** A row's place among the rows: its key, the kept target and the one being typed. */
export interface RowPlace {
  key: string
  kept: Target | null
  target: Target
}

const drawn = new WeakMap<Target, RowView>()

const isPlain = (value: unknown) => typeof value !== 'object' || value === null

/** Alike in their plain values, which are all that a row shows; the checks stand on a page of their own. */
function flatSame(a: object, b: object): boolean {
  if (a === b) return true
  const [x, y] = [a as Record<string, unknown>, b as Record<string, unknown>]
  return Object.keys(x).every(
    (name) => Object.is(x[name], y[name]) || !(isPlain(x[name]) && isPlain(y[name])),
  )
}

const listSame = (a: readonly object[], b: readonly object[]) =>
  a.length === b.length && a.every((one, index) => flatSame(one, b[index] ?? {}))

/** What a row shows of a target's numbers; the hours of single nights stand nowhere in it. */
function shown(computed: TargetComputation | null): string {
  return JSON.stringify(computed && { ...computed, visibleHoursByNight: null })
}

/** The view drawn last for this target, when nothing in it differs: its row need not be drawn again. */
function steady(view: RowView): RowView {
  const before = drawn.get(view.target)
  const isSame =
    before &&
    before.key === view.key &&
    before.kept === view.kept &&
    before.neededSeconds === view.neededSeconds &&
    before.verdict === view.verdict &&
    before.maxAirmass === view.maxAirmass &&
    before.times === view.times &&
    listSame(before.observations, view.observations) &&
    listSame(before.observationNumbers, view.observationNumbers) &&
    (before.computed === view.computed || shown(before.computed) === shown(view.computed))
  if (isSame) return before
  drawn.set(view.target, view)
  return view
}

function byTarget<T extends { targetId: number }>(all: readonly T[]): Map<number, T[]> {
  const groups = new Map<number, T[]>()
  for (const one of all) {
    const group = groups.get(one.targetId)
    if (group) group.push(one)
    else groups.set(one.targetId, [one])
  }
  return groups
}

/** Rows with everything their cells show. */
export function rowViews(
  places: readonly RowPlace[],
  contents: ProposalContents,
  computation: ProposalComputation,
): RowView[] {
  const asked = byTarget(contents.observations)
  const computed = byTarget(computation.observations)
  const targets = byTarget(computation.targets)
  return places.map(({ key, kept, target }) => {
    const observations = asked.get(target.id) ?? []
    const numbers = computed.get(target.id) ?? []
    const telescope = contents.modes.find(({ modeId }) => modeId === observations[0]?.modeId)?.telescope
    const isKnown = numbers.length > 0 && numbers.every(({ neededSeconds }) => neededSeconds !== null)
    return steady({
      key,
      kept,
      target,
      computed: targets.get(target.id)?.[0] ?? null,
      observations,
      observationNumbers: numbers,
      neededSeconds: isKnown ? numbers.reduce((sum, one) => sum + (one.neededSeconds ?? 0), 0) : null,
      verdict: worstVerdict(numbers.map((one) => one.verdict)),
      times: numbers[0]?.times ?? null,
      maxAirmass: conditionsOf(contents, observations[0]).maxAirmass,
      limits: limitWords(pointingOf(contents.site, telescope)),
    })
  })
}
