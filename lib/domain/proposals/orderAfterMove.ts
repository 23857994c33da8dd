import type { Investigator } from './types'

/** The names in order once one has moved by a place; unchanged where it would pass the end or the first, who leads. */
export function orderAfterMove(people: readonly Investigator[], id: number, by: -1 | 1): Investigator[] {
  const order = [...people]
  const from = order.findIndex((person) => person.id === id)
  const to = from + by
  const person = order[from]
  const other = order[to]
  if (!person || !other || person.role === 'pi' || other.role === 'pi') return order
  order[from] = other
  order[to] = person
  return order
}
