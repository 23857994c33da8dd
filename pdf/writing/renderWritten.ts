import { createElement } from 'react'
import { render } from '../render'
import { shapesOf } from './shapesOf'
import { WrittenDocument, type WrittenDocumentProps } from './WrittenDocument'

/** A text written here as PDF bytes. */
export async function renderWritten({
  pictures,
  ...given
}: Omit<WrittenDocumentProps, 'shapes' | 'pictures'> & {
  pictures: ReadonlyMap<string, Uint8Array>
}): Promise<Uint8Array> {
  const shapes = await shapesOf(given.written)
  const buffers = new Map([...pictures].map(([sha256, bytes]) => [sha256, Buffer.from(bytes)]))
  return render(() => createElement(WrittenDocument, { ...given, shapes, pictures: buffers }))
}
