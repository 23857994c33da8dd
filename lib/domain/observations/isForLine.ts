import type { ModeRecord } from '../facility/types'
import type { Observation, Target } from '../proposals/types'

/** Whether an observation asks for the line whose brightness the target states, and not for the continuum. */
export function isForLine(asked: {
  target: Pick<Target, 'line'>
  observation: Pick<Observation, 'feature'>
  mode: Pick<ModeRecord, 'kind'> | undefined
}): boolean {
  // A version that was frozen before lines were asked for holds none.
  const line = asked.target.line ?? null
  return asked.mode?.kind === 'long-slit' && line !== null && asked.observation.feature === line.name
}
