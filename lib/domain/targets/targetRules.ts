import { refuse } from '@/lib/errors'
import type { Target } from '../proposals/types'
import { mostTargets } from './limits'
import type { TargetValues } from './types'

/** Names tell targets apart: compared as the database does, without case. */
export const nameKey = (name: string): string => name.trim().normalize('NFC').toLocaleLowerCase('en-GB')

/** Refuses a name another target has already; `field` is where the message goes. */
export function requireFreeName(
  targets: readonly Pick<Target, 'id' | 'name'>[],
  name: string,
  own: number | null,
  field = 'name',
): void {
  const taken = targets.some((target) => target.id !== own && nameKey(target.name) === nameKey(name))
  if (taken) throw refuse.field(field, 'Another target is called that already.')
}

/** Refuses more targets than a proposal holds. */
export function requireRoom(present: number, added: number): void {
  if (present + added > mostTargets)
    throw refuse.invalid(
      `A proposal holds at most ${mostTargets} targets; this would make ${present + added}.`,
    )
}

/** The next free place at the end. */
export const nextPosition = (targets: readonly Pick<Target, 'position'>[]): number =>
  targets.reduce((last, { position }) => Math.max(last, position), 0) + 1

/** The targets in an order someone asked for; null when it is not an order of exactly these. */
export function inOrder<T extends { id: number }>(targets: readonly T[], ids: readonly number[]): T[] | null {
  const byId = new Map(targets.map((target) => [target.id, target]))
  const ordered = ids.flatMap((id) => byId.get(id) ?? [])
  return ids.length === targets.length && new Set(ids).size === ids.length && ordered.length === ids.length
    ? ordered
    : null
}

const comparable = (values: TargetValues) =>
  JSON.stringify([
    values.raDeg,
    values.decDeg,
    values.redshift,
    values.brightness?.value ?? null,
    values.brightness?.band ?? null,
    values.brightness?.system ?? null,
  ])

/** The same position, redshift and magnitude to the last digit: importing it again changes nothing. */
export function saysTheSame(a: TargetValues, b: TargetValues): boolean {
  return comparable(a) === comparable(b)
}
