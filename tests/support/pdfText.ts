import { execFileSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

function withFile(bytes: Uint8Array, tool: string, args: (file: string) => string[]): string {
  const folder = mkdtempSync(join(tmpdir(), 'noctuary-pdf-'))
  try {
    const file = join(folder, 'file.pdf')
    writeFileSync(file, bytes)
    return execFileSync(tool, args(file), { encoding: 'utf8' })
  } finally {
    rmSync(folder, { recursive: true })
  }
}

/** The text of a PDF as poppler reads it, laid out in columns. */
export const pdfText = (bytes: Uint8Array): string =>
  withFile(bytes, 'pdftotext', (file) => ['-layout', '-enc', 'UTF-8', file, '-'])

/** The properties of a PDF as poppler reads them. */
export const pdfInfo = (bytes: Uint8Array): string => withFile(bytes, 'pdfinfo', (file) => [file])

/** The pictures of a PDF as poppler reads them, a line each. */
export const pdfPictures = (bytes: Uint8Array): string =>
  withFile(bytes, 'pdfimages', (file) => ['-list', file])
