import { PDFDocument, StandardFonts } from 'pdf-lib'

const paragraphs = [
  'The question is old and the sample is new. We measure the same quantity in every object, by the same method, and say beforehand what each outcome would mean.',
  'Each target stands alone: a part of the time gives a part of the answer, and no single night decides. The hours follow from the depth we need at the poorest conditions we accept, with the overheads of the mode.',
  'Distances enter as the square in flux and, where the sky is brighter than the source, nearly as the fourth power in time. We state the cosmology throughout and give the same numbers under a second one.',
  'The data are reduced within weeks by an existing pipeline, and the reduced spectra and images are released with the paper.',
]

/** A justification of two pages without names, as an author would upload it. */
export async function paperPdf(title: string): Promise<Uint8Array> {
  const document = await PDFDocument.create()
  const font = await document.embedFont(StandardFonts.Helvetica)
  const bold = await document.embedFont(StandardFonts.HelveticaBold)
  // The standard fonts know Latin letters only.
  const plain = title
    .replace(/α/g, 'alpha')
    .replace(/β/g, 'beta')
    .replace(/[^\x20-\x7e]/g, '')
  for (const part of ['The question', 'The method and the hours']) {
    const page = document.addPage([595, 842])
    page.drawText(plain, { x: 56, y: 770, size: 15, font: bold, maxWidth: 480, lineHeight: 19 })
    page.drawText(part, { x: 56, y: 715, size: 12, font: bold })
    paragraphs.forEach((text, index) =>
      page.drawText(text, { x: 56, y: 690 - index * 72, size: 10.5, font, maxWidth: 483, lineHeight: 14 }),
    )
  }
  return document.save()
}
