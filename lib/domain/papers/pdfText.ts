import { extractText, getDocumentProxy, getMeta } from 'unpdf'
import { refuse } from '@/lib/errors'

export interface PdfText {
  /** The words of each page. */
  pages: string[]
  /** Title, author and the like that programs write into a PDF. */
  properties: string[]
}

/** What can be read in a PDF without looking at it: the words of its pages and its properties. */
export async function pdfText(bytes: Uint8Array): Promise<PdfText> {
  try {
    // A copy: the reader takes the bytes it is given over.
    const document = await getDocumentProxy(new Uint8Array(bytes))
    const { text } = await extractText(document, { mergePages: false })
    const { info } = await getMeta(document)
    await document.destroy()
    const properties = Object.values(info).filter((value): value is string => typeof value === 'string')
    return { pages: text, properties }
  } catch (cause) {
    throw Object.assign(
      refuse.field('file', 'The words of this PDF cannot be read. Export it anew and send that.'),
      {
        cause,
      },
    )
  }
}
