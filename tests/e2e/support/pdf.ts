import { execFileSync } from 'node:child_process'
import { mkdtempSync, readFileSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { PDFDocument, StandardFonts } from 'pdf-lib'

/** A PDF of so many pages with a line of text on each. */
export async function pdfOf(
  pages: number,
  line = 'The sample answers the question by itself.',
): Promise<Buffer> {
  const document = await PDFDocument.create()
  const font = await document.embedFont(StandardFonts.Helvetica)
  for (let page = 1; page <= pages; page += 1)
    document.addPage([595, 842]).drawText(`${line} Page ${page}.`, { x: 56, y: 760, size: 11, font })
  return Buffer.from(await document.save())
}

/** The text of a PDF as pdftotext (poppler) reads it back. */
export function textOf(bytes: Buffer): string {
  const folder = mkdtempSync(join(tmpdir(), 'packet-'))
  const file = join(folder, 'packet.pdf')
  writeFileSync(file, bytes)
  execFileSync('pdftotext', ['-layout', file, join(folder, 'packet.txt')])
  return readFileSync(join(folder, 'packet.txt'), 'utf8')
}
