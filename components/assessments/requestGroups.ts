import type { RequestLine } from '@/lib/domain/assessments/types'

/** The requests of one call on one instrument, which go to the panel together. */
export interface RequestGroup {
  callNumber: number
  instrumentId: number
  instrument: string
  count: number
  open: number
  /** How many the panel has not got yet. */
  toPass: number
  /** The panel ranks or has decided. */
  isSettled: boolean
}

export function requestGroups(lines: readonly RequestLine[]): RequestGroup[] {
  const groups = new Map<string, RequestGroup>()
  for (const line of lines) {
    const key = `${line.callNumber}:${line.instrumentId}`
    const { callNumber, instrumentId, instrument, isSettled } = line
    const none = { callNumber, instrumentId, instrument, count: 0, open: 0, toPass: 0, isSettled }
    const group = groups.get(key) ?? none
    group.count += 1
    group.open += line.assessed === null ? 1 : 0
    group.toPass += line.passedAt === null ? 1 : 0
    groups.set(key, group)
  }
  return [...groups.values()]
}
