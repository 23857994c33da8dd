import { createHash } from 'node:crypto'
import type { ObservationComputation, ProposalComputation } from '../observations/types.ts'
import type { CallKind } from '../calls/types.ts'
import type { ConstraintSet, ProposalContents, Target } from '../proposals/types.ts'
import { unwritten } from '../proposals/unwritten.ts'

/** A proposal as it was sent: what it said, what was computed from it, and by which engine. */
export interface Snapshot {
  contents: ProposalContents
  computation: ProposalComputation
  engineVersion: string
}

/** Values in an order of their own, so that the same proposal always gives the same bytes. */
function ordered(value: unknown): unknown {
  if (value instanceof Date) return value.toISOString()
  if (Array.isArray(value)) return value.map(ordered)
  if (typeof value !== 'object' || value === null) return value
  return Object.fromEntries(
    Object.entries(value)
      .sort(([a], [b]) => (a < b ? -1 : 1))
      .map(([key, inner]) => [key, ordered(inner)]),
  )
}

/** The text that is stored and its fingerprint (SHA-256, hex). */
export function freeze(snapshot: Snapshot): { text: string; sha256: string } {
  const text = JSON.stringify(ordered(snapshot))
  return { text, sha256: createHash('sha256').update(text).digest('hex') }
}

const moments = new Set([
  'updatedAt',
  'uploadedAt',
  'confirmedAt',
  'opensAt',
  'closesAt',
  'graceUntil',
  'assessmentsDueAt',
  'reviewsDueAt',
  'panelMeetsAt',
  'lettersAt',
])

type May<T, K extends keyof T> = Omit<T, K> & Partial<Pick<T, K>>

type KindAsks = 'targetLimit' | 'takesAwaited' | 'needsCadence' | 'needsLastNight'

/** A snapshot that may have been frozen before proposals had all they have now. */
interface Thawed {
  contents: Omit<
    May<ProposalContents, 'groups' | 'wishes' | 'writings' | 'figures'>,
    'targets' | 'constraintSets' | 'kind'
  > & {
    kind: May<CallKind, KindAsks>
    constraintSets: May<ConstraintSet, 'cadence'>[]
    targets: May<Target, 'group' | 'opportunity' | 'spectrum'>[]
  }
  computation: Omit<May<ProposalComputation, 'groups'>, 'observations'> & {
    observations: May<ObservationComputation, 'times' | 'carried'>[]
  }
  engineVersion: string
}

function whole({ contents, computation, engineVersion }: Thawed): Snapshot {
  const targets = contents.targets.map((target) => ({
    ...{ group: null, opportunity: null, spectrum: null },
    ...target,
  }))
  // A kind that took what is awaited before that was asked of it did so by what it named.
  const takesAwaited = targets.some(({ opportunity }) => opportunity !== null)
  const asks = { targetLimit: null, takesAwaited, needsCadence: false, needsLastNight: false }
  const kind = { ...asks, ...contents.kind }
  const constraintSets = contents.constraintSets.map((set) => ({ ...set, cadence: set.cadence ?? null }))
  const observations = computation.observations.map((one) => ({ times: 1, carried: null, ...one }))
  return {
    contents: {
      ...{ groups: [], wishes: [], writings: unwritten, figures: [] },
      ...contents,
      ...{ kind, constraintSets, targets },
    },
    computation: { groups: [], ...computation, observations },
    engineVersion,
  }
}

/** The snapshot back from its text, moments as `Date` again. */
export function thaw(text: string): Snapshot {
  return whole(
    JSON.parse(text, (key, value: unknown) =>
      moments.has(key) && typeof value === 'string' ? new Date(value) : value,
    ) as Thawed,
  )
}
