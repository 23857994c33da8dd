import { KeyboardCode, type KeyboardCoordinateGetter } from '@dnd-kit/core'

/** Up and down carry a reader from one proposal to the next, as the rows stand on the page. */
export const rowsByArrow: KeyboardCoordinateGetter = (event, { context }) => {
  const step = { [KeyboardCode.Down]: 1, [KeyboardCode.Up]: -1 }[event.code]
  const { collisionRect, droppableContainers, droppableRects, over } = context
  if (!step || !collisionRect) return undefined
  event.preventDefault()
  const places = droppableContainers
    .getEnabled()
    .flatMap(({ id }) => {
      const rect = droppableRects.get(id)
      return rect ? [{ id, rect }] : []
    })
    .sort((a, b) => a.rect.top - b.rect.top)
  const middle = collisionRect.top + collisionRect.height / 2
  const here = places.findIndex(({ id }) => id === over?.id)
  const next =
    here >= 0
      ? places[here + step]
      : step > 0
        ? places.find(({ rect }) => rect.top > middle)
        : places.findLast(({ rect }) => rect.top < middle)
  if (!next) return undefined
  const { left, top, height } = next.rect
  return { x: left, y: top + (height - collisionRect.height) / 2 }
}
