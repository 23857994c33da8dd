import { PDFDict, PDFName, PDFRawStream, PDFRef, PDFStream, type PDFDocument } from 'pdf-lib'
import { withoutNotes } from './withoutNotes'

// What programs write beside what can be seen: properties of parts, their own data, dates.
const notes = ['Metadata', 'PieceInfo', 'LastModified'].map((name) => PDFName.of(name))

function dictionaryOf(object: unknown): PDFDict | null {
  if (object instanceof PDFStream) return object.dict
  return object instanceof PDFDict ? object : null
}

/** Only a stream that is one JPEG and nothing more; others are packed and hold no notes of a camera. */
function isPhotograph(stream: PDFRawStream): boolean {
  const filter = stream.dict.lookup(PDFName.of('Filter'))
  return filter === PDFName.of('DCTDecode') || filter?.toString() === '[ /DCTDecode ]'
}

/** Takes everything out of a document that cannot be seen and could say who made it: of its parts and of pictures. */
export function stripNotes(document: PDFDocument): void {
  const { context } = document
  for (const [ref, object] of context.enumerateIndirectObjects()) {
    const dictionary = dictionaryOf(object)
    for (const name of dictionary ? notes : []) {
      const value = dictionary?.get(name)
      if (value instanceof PDFRef) context.delete(value)
      dictionary?.delete(name)
    }
    if (!(object instanceof PDFRawStream) || !isPhotograph(object)) continue
    const bytes = withoutNotes(object.contents)
    if (bytes.length === object.contents.length) continue
    object.dict.set(PDFName.of('Length'), context.obj(bytes.length))
    context.assign(ref, PDFRawStream.of(object.dict, bytes))
  }
}
