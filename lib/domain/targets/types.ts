import type { Target } from '../proposals/types'

/** What a row of the table says of a target; its place, key and version are kept elsewhere. */
export type TargetValues = Omit<Target, 'id' | 'version' | 'position'>
