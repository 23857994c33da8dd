import { PDFDocument, StandardFonts } from 'pdf-lib'

const kept = new Map<number, Promise<Uint8Array>>()

/** A justification of so many pages, with properties that name its author, as word processors write them. */
export function samplePdf(pages: number): Promise<Uint8Array> {
  const known = kept.get(pages)
  if (known) return known
  const made = make(pages)
  kept.set(pages, made)
  return made
}

async function make(pages: number): Promise<Uint8Array> {
  const document = await PDFDocument.create()
  document.setAuthor('Maren Sollvik')
  document.setTitle('lens-v6 (Sollvik)')
  document.setCreator('Sollvik Institute')
  const font = await document.embedFont(StandardFonts.Helvetica)
  for (let page = 1; page <= pages; page += 1)
    document.addPage([595, 842]).drawText(`Justification, sheet ${page}`, { x: 72, y: 720, font, size: 12 })
  return document.save()
}
