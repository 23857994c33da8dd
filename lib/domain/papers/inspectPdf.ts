import { PDFDocument } from 'pdf-lib'
import { refuse } from '@/lib/errors'
import { countInWords, formatBytes } from '@/lib/format'
import { activeContent } from './activeContent'
import { fileKind } from './fileKind'
import { maxPaperBytes } from './limits'
import { pdfText } from './pdfText'

export interface Inspected {
  pages: number
}

const no = (sentence: string) => refuse.field('file', sentence)

/** A PDF ends with its own mark; what follows, or the lack of it, betrays a cut or a disguised file. */
function checkEnd(bytes: Uint8Array): void {
  const tail = Buffer.from(bytes.subarray(Math.max(0, bytes.length - 4096))).toString('latin1')
  const end = tail.lastIndexOf('%%EOF')
  if (end < 0) throw no('The file ends in the middle: it did not arrive whole, or was cut before.')
  if (tail.slice(end + 5).replace(/[\s\0]/g, '').length > 0)
    throw no('Something else hangs on the end of this PDF. Print it to a new PDF and send that.')
}

const locked = () =>
  no('The file is locked with a password. Send it without one: reviewers could not open it.')

/** The document and its pages. Broken files make the library fail in many ways; all read the same here. */
async function opened(bytes: Uint8Array): Promise<{ document: PDFDocument; pages: number }> {
  let document: PDFDocument
  let pages: number
  try {
    document = await PDFDocument.load(bytes, {
      updateMetadata: false,
      throwOnInvalidObject: true,
      ignoreEncryption: true,
    })
    pages = document.getPageCount()
  } catch {
    if (Buffer.from(bytes).includes('/Encrypt')) throw locked()
    throw no('The file says it is a PDF but cannot be read as one. Export it anew and send that.')
  }
  if (document.isEncrypted) throw locked()
  return { document, pages }
}

/**
 * Looks a document through before it is kept: what it is, whole, unlocked, passive, not too long.
 * Each cause has one sentence, at the field `file`.
 */
export async function inspectPdf(bytes: Uint8Array, fileName: string, pageLimit: number): Promise<Inspected> {
  if (bytes.length === 0) throw no(`${fileName} is empty.`)
  if (bytes.length > maxPaperBytes)
    throw no(`${fileName} has ${formatBytes(bytes.length)}; at most ${formatBytes(maxPaperBytes)} are taken.`)
  const kind = fileKind(bytes)
  if (kind !== 'pdf') {
    const instead = typeof kind === 'string' ? `a ${kind.toUpperCase()} picture` : kind.instead
    throw no(`${fileName} is not a PDF: by its contents it is ${instead}.`)
  }
  checkEnd(bytes)
  const { document, pages } = await opened(bytes)
  const active = activeContent(document)
  if (active)
    throw no(`The PDF carries ${active}. Print it to a new PDF, which leaves that out, and send that.`)
  if (pages === 0) throw no('The PDF has no pages.')
  if (pages > pageLimit)
    throw no(`The PDF has ${pages} pages; this document may have ${countInWords(pageLimit, 'page')}.`)
  if ((await pdfText(bytes)).pages.length !== pages)
    throw no('The PDF counts its pages in two ways. Print it to a new PDF and send that.')
  return { pages }
}
