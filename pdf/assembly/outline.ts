import { PDFDict, PDFHexString, PDFName, PDFNumber, type PDFDocument, type PDFRef } from 'pdf-lib'

export interface Bookmark {
  title: string
  /** Page it leads to, from 0. */
  page: number
}

/** Bookmarks of a document, one level deep. pdf-lib has none of its own, so the objects are written here. */
export function addOutline(document: PDFDocument, bookmarks: readonly Bookmark[]): void {
  const { context } = document
  const root = context.nextRef()
  const refs = bookmarks.map(() => context.nextRef())
  const pages = document.getPages()
  bookmarks.forEach(({ title, page }, index) => {
    const target = pages[page]
    if (!target) return
    const item = PDFDict.withContext(context)
    item.set(PDFName.of('Title'), PDFHexString.fromText(title))
    item.set(PDFName.of('Parent'), root)
    item.set(PDFName.of('Dest'), context.obj([target.ref, PDFName.of('Fit')]))
    link(item, 'Prev', refs[index - 1])
    link(item, 'Next', refs[index + 1])
    const ref = refs[index]
    if (ref) context.assign(ref, item)
  })
  const outline = PDFDict.withContext(context)
  outline.set(PDFName.of('Type'), PDFName.of('Outlines'))
  link(outline, 'First', refs[0])
  link(outline, 'Last', refs.at(-1))
  outline.set(PDFName.of('Count'), PDFNumber.of(refs.length))
  context.assign(root, outline)
  document.catalog.set(PDFName.of('Outlines'), root)
}

function link(dict: PDFDict, key: string, ref: PDFRef | undefined): void {
  if (ref) dict.set(PDFName.of(key), ref)
}
