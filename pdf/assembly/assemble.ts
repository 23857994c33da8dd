import { createElement } from 'react'
import { PDFDocument, type PDFEmbeddedPage } from 'pdf-lib'
import { render } from '../render'
import { Footers, type FooterWords } from './Footers'
import { addOutline, type Bookmark } from './outline'
import { stripNotes } from './stripNotes'

export interface Part {
  bytes: Uint8Array
  bookmark: string
  /** Pages of others are drawn a little smaller, so that the footer covers nothing. */
  isOwn: boolean
}

export interface AssembleInput {
  /** In the properties of the file; nothing else is: no author, no file name, no date. */
  title: string
  parts: readonly Part[]
  footer: FooterWords
}

const a4 = { width: 595.28, height: 841.89 }
const footRoom = 52

/**
 * Draws the pages of several documents onto fresh sheets with one footer running through them. Only what can be
 * seen is taken over: properties, links, forms and scripts of the parts stay behind. Same parts, same bytes.
 */
export async function assemble({
  title,
  parts,
  footer,
}: AssembleInput): Promise<{ bytes: Uint8Array; pages: number }> {
  const document = await PDFDocument.create({ updateMetadata: false })
  const sheets: { drawn: PDFEmbeddedPage; isOwn: boolean }[] = []
  const bookmarks: Bookmark[] = []
  for (const part of parts) {
    bookmarks.push({ title: part.bookmark, page: sheets.length })
    const source = await PDFDocument.load(part.bytes, { updateMetadata: false })
    const all = source.getPageIndices()
    for (const drawn of await document.embedPdf(source, all)) sheets.push({ drawn, isOwn: part.isOwn })
  }
  const footers = await document.embedPdf(
    await render(() => createElement(Footers, { pages: sheets.length, words: footer })),
    sheets.map((_, index) => index),
  )
  sheets.forEach(({ drawn, isOwn }, index) => {
    const page = document.addPage([a4.width, a4.height])
    const room = isOwn ? 0 : footRoom
    const scale = Math.min(a4.width / drawn.width, (a4.height - room) / drawn.height)
    const [width, height] = [drawn.width * scale, drawn.height * scale]
    page.drawPage(drawn, { x: (a4.width - width) / 2, y: a4.height - height, width, height })
    const foot = footers[index]
    if (foot) page.drawPage(foot, { x: 0, y: 0 })
  })
  addOutline(document, bookmarks)
  document.setTitle(title, { showInWindowTitleBar: true })
  document.setLanguage('en-GB')
  // Pages are copied when they are written; what hangs on their parts is known only then.
  await document.flush()
  stripNotes(document)
  const bytes = await document.save({ addDefaultPage: false, updateFieldAppearances: false })
  return { bytes, pages: sheets.length }
}
