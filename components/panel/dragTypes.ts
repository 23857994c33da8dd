/** What is dragged: a reviewer, from the strip or from a proposal they read. */
export interface DraggedReader {
  personId: number
  name: string
  /** The assignment they leave when dropped elsewhere; null from the strip. */
  from: { assignmentId: number; proposalId: number; reviewNumber: string } | null
}

export const isDragged = (data: unknown): data is DraggedReader =>
  typeof data === 'object' && data !== null && 'personId' in data && 'from' in data
