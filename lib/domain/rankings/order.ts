/**
 * Places and the line in the whole list, moved by someone who sees only part of it. `full` is the order of all
 * proposals; those in `hidden` are not shown, and places on screen count only the others.
 */
export function visibleOrder(full: readonly number[], hidden: ReadonlySet<number>): number[] {
  return full.filter((id) => !hidden.has(id))
}

/** The whole list after moving one proposal to a place among those shown (1 first; places past the ends are the ends). */
export function moveTo(
  full: readonly number[],
  hidden: ReadonlySet<number>,
  id: number,
  place: number,
): number[] {
  const shown = visibleOrder(full, hidden)
  const from = shown.indexOf(id) + 1
  const to = Math.min(Math.max(place, 1), shown.length)
  if (from === 0 || from === to) return [...full]
  const neighbour = shown[to - 1]
  const rest = full.filter((other) => other !== id)
  const index = rest.indexOf(neighbour ?? -1)
  rest.splice(to < from ? index : index + 1, 0, id)
  return rest
}

/** How many of those shown stand above a line drawn after `line` of the whole list. */
export function visibleLine(full: readonly number[], hidden: ReadonlySet<number>, line: number): number {
  return visibleOrder(full.slice(0, line), hidden).length
}

/** The line in the whole list, moved past one proposal of those shown; where there is none it stays. */
export function stepLine(
  full: readonly number[],
  hidden: ReadonlySet<number>,
  line: number,
  direction: 'up' | 'down',
): number {
  if (direction === 'up') {
    for (let index = line - 1; index >= 0; index -= 1) if (!hidden.has(full[index] ?? -1)) return index
    return line
  }
  for (let index = line; index < full.length; index += 1) if (!hidden.has(full[index] ?? -1)) return index + 1
  return line
}
