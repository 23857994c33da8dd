import { PDFDocument, PDFName, PDFString, StandardFonts } from 'pdf-lib'

/** A PDF whose pages say `words`, with whatever `change` adds to it. */
export async function pdfWith(
  words: readonly string[],
  change: (document: PDFDocument) => void | Promise<void> = () => undefined,
  objectStreams = true,
): Promise<Uint8Array> {
  const document = await PDFDocument.create()
  const font = await document.embedFont(StandardFonts.Helvetica)
  for (const text of words) document.addPage([595, 842]).drawText(text, { x: 72, y: 720, font, size: 12 })
  await change(document)
  return document.save({ useObjectStreams: objectStreams })
}

/** Sets an entry of the catalogue: where scripts and opening actions hang. */
export function inCatalog(key: string, value: Record<string, unknown>) {
  return (document: PDFDocument) => {
    document.catalog.set(PDFName.of(key), document.context.obj(value as never))
  }
}

export const script = (document: PDFDocument) => {
  document.addJavaScript('main', 'app.alert(1)')
}

export const launch = inCatalog('OpenAction', { S: 'Launch', F: PDFString.of('calc.exe') })
export const attached = async (document: PDFDocument) => {
  await document.attach(new Uint8Array([1, 2, 3]), 'data.csv', { mimeType: 'text/csv' })
}

/** An encrypted file as far as a reader sees: its trailer names a security handler. */
export async function encryptedPdf(): Promise<Uint8Array> {
  const text = Buffer.from(await pdfWith(['secret'], undefined, false)).toString('latin1')
  return Buffer.from(
    text.replace(
      /trailer\s*<</,
      'trailer\n<<\n/Encrypt << /Filter /Standard /V 1 /R 2 /O (x) /U (y) /P -4 >>',
    ),
    'latin1',
  )
}

/** The bytes as the browser sends them. */
export const asFile = (bytes: Uint8Array, name = 'quads-v5.pdf'): File =>
  new File([new Uint8Array(bytes)], name, { type: 'application/pdf' })
