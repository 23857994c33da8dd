import type { AssignmentDesk } from './assignmentProgramme'

/** What a page outside the range of loads costs in a programme: more than all readers of a proposal bring. */
export const outsideCost = ({ demands }: Pick<AssignmentDesk, 'demands'>) =>
  1 + Math.max(1, ...demands.map(({ wanted, standing }) => wanted + standing.length))
