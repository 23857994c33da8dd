import { PDFArray, PDFDict, PDFName, PDFStream, type PDFDocument, type PDFObject } from 'pdf-lib'

const words: Readonly<Record<string, string>> = {
  JavaScript: 'a script',
  JS: 'a script',
  AA: 'actions that start by themselves',
  Launch: 'an action that starts a program',
  EmbeddedFile: 'an attached file',
  EmbeddedFiles: 'an attached file',
  RichMedia: 'moving media',
  XFA: 'a form with its own program',
  SubmitForm: 'a form that sends data away',
  ImportData: 'a form that reads other files',
}

const nameOf = (object: PDFObject | undefined) => (object instanceof PDFName ? object.decodeText() : null)

/** An opening action that only says which page to show first is what typesetting programs write; it is let be. */
function opensAView(document: PDFDocument, value: PDFObject): boolean {
  const action = document.context.lookup(value)
  if (action instanceof PDFArray || action instanceof PDFName) return true
  return action instanceof PDFDict && nameOf(action.lookup(PDFName.of('S'))) === 'GoTo'
}

function inDictionary(document: PDFDocument, dictionary: PDFDict): string | null {
  for (const [key, value] of dictionary.entries()) {
    const name = key.decodeText()
    if (name === 'OpenAction' && !opensAView(document, value)) return 'an action on opening'
    const byKey = words[name]
    if (byKey) return byKey
    // What an action or stream is stands as a name: /S /Launch, /Type /EmbeddedFile.
    const byValue =
      name === 'S' || name === 'Type' || name === 'Subtype' ? words[nameOf(value) ?? ''] : undefined
    if (byValue) return byValue
    const inner = inObject(document, value)
    if (inner) return inner
  }
  return null
}

function inObject(document: PDFDocument, object: PDFObject): string | null {
  if (object instanceof PDFStream) return inDictionary(document, object.dict)
  if (object instanceof PDFDict) return inDictionary(document, object)
  if (!(object instanceof PDFArray)) return null
  for (const item of object.asArray()) {
    const found = inObject(document, item)
    if (found) return found
  }
  return null
}

/** The first thing in a PDF that could act by itself, in words; null when it only lies there to be read. */
export function activeContent(document: PDFDocument): string | null {
  for (const [, object] of document.context.enumerateIndirectObjects()) {
    const found = inObject(document, object)
    if (found) return found
  }
  return null
}
