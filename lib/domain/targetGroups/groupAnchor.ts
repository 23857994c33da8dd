import type { TargetGroup } from '../proposals/types'

/** Where a group stands on the targets page. */
export const groupAnchor = ({ id }: Pick<TargetGroup, 'id'>): string => `group-${id}`
