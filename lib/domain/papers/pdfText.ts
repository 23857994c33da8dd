import { extractText, getDocumentProxy, getMeta } from 'unpdf'
import { refuse } from '@/lib/errors'

export interface PdfText {
  /** The words of each page. */
  pages: string[]
  /** Title, author and the like that programs write into a PDF, those that say something. */
  properties: { name: string; value: string }[]
}

const named = ['Title', 'Author', 'Subject', 'Keywords', 'Creator', 'Producer'] as const

/** What can be read in a PDF without looking at it: the words of its pages and its properties. */
export async function pdfText(bytes: Uint8Array): Promise<PdfText> {
  try {
    // A copy: the reader takes the bytes it is given over.
    const document = await getDocumentProxy(new Uint8Array(bytes))
    const { text } = await extractText(document, { mergePages: false })
    const { info } = await getMeta(document)
    await document.destroy()
    const properties = named.flatMap((name) => {
      const value: unknown = info[name]
      return typeof value === 'string' && value.trim() !== '' ? [{ name, value: value.trim() }] : []
    })
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
