/**
 * A merged order after one proposal took the place of another. Those of its own panel that it passed go with it, so that
 * the panel's own order stays: a person who does not see them can move past them without learning of them.
 *
 * @param order all proposals, the first first
 * @param to the proposal whose place is taken
 */
export function moveBetween(
  order: readonly number[],
  panelOf: (proposal: number) => number,
  proposal: number,
  to: number,
): number[] {
  const from = order.indexOf(proposal)
  const target = order.indexOf(to)
  if (from === -1 || target === -1 || from === target) return [...order]
  const passed = target < from ? order.slice(target, from) : order.slice(from + 1, target + 1)
  const own = passed.filter((one) => panelOf(one) === panelOf(proposal))
  const others = passed.filter((one) => panelOf(one) !== panelOf(proposal))
  const moved = target < from ? [...own, proposal, ...others] : [...others, proposal, ...own]
  const first = Math.min(from, target)
  return [...order.slice(0, first), ...moved, ...order.slice(first + moved.length)]
}
