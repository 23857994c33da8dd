import { renderToBuffer, type DocumentProps } from '@react-pdf/renderer'
import type { ReactElement } from 'react'
import { loadFonts } from './fonts'

/** A document as PDF bytes. The element is made once the fonts are read, since text asks them what can be printed. */
export async function render<Props>(make: () => ReactElement<Props>): Promise<Uint8Array> {
  await loadFonts()
  // Typed for <Document> itself; each of our documents returns one.
  return renderToBuffer(make() as ReactElement<DocumentProps>)
}
