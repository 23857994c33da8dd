import { PDFDocument, PDFName, PDFString } from 'pdf-lib'
import sharp from 'sharp'
import { getDocumentProxy, getMeta } from 'unpdf'
import { describe, expect, it } from 'vitest'
import { assemble } from '@/pdf/assembly/assemble'
import { withoutNotes } from '@/pdf/assembly/withoutNotes'
import { pdfPictures } from '../support/pdfText'

const author = 'Ilse Marrowby'

async function photograph(): Promise<Uint8Array> {
  const plain = { create: { width: 60, height: 40, channels: 3 as const, background: '#8899aa' } }
  return sharp(plain)
    .jpeg()
    .withExif({ IFD0: { Artist: author } })
    .toBuffer()
}

/** A document that says who made it in every place programs write to. */
async function tellingPdf(): Promise<Uint8Array> {
  const document = await PDFDocument.create()
  document.setAuthor(author)
  document.setTitle(`lens (${author})`)
  document.setProducer(`${author} press`)
  const xmp = (words: string) =>
    document.context.register(
      document.context.stream(`<x:xmpmeta xmlns:x="adobe:ns:meta/">${words}</x:xmpmeta>`, {
        Type: 'Metadata',
        Subtype: 'XML',
      }),
    )
  document.catalog.set(PDFName.of('Metadata'), xmp(author))
  const picture = await document.embedJpg(await photograph())
  const page = document.addPage([300, 300])
  page.drawText('What can be seen')
  page.drawImage(picture, { x: 20, y: 20 })
  page.node.set(PDFName.of('PieceInfo'), document.context.obj({ Maker: PDFString.of(author) }))
  await document.flush()
  const stream = document.context.lookup(picture.ref)
  if (stream && 'dict' in stream)
    (stream as { dict: { set(key: PDFName, value: unknown): void } }).dict.set(
      PDFName.of('Metadata'),
      xmp(author),
    )
  return document.save({ useObjectStreams: false })
}

// Seen to fail: with the metadata of a picture let be, with its EXIF let be, with the title taken from the part.
describe('what a packet says about whoever made its parts', () => {
  it('is nothing, in its properties, in those of its parts and in its pictures', async () => {
    const part = await tellingPdf()
    expect(Buffer.from(part).toString('latin1').split(author).length).toBeGreaterThan(4)
    const { bytes } = await assemble({
      title: '14-083',
      parts: [{ bytes: part, bookmark: 'Justification', isOwn: false }],
      footer: { left: 'Without names', middle: 'ab12', right: '14-083' },
    })
    const read = await getDocumentProxy(new Uint8Array(bytes))
    const { info, metadata } = await getMeta(read)
    expect(info).toMatchObject({ Title: '14-083' })
    expect(Object.keys(info)).not.toEqual(expect.arrayContaining(['Author']))
    expect(info.Author ?? info.Creator ?? info.Producer ?? null).toBeNull()
    expect(metadata).toEqual({})
    // The picture is still there, as wide as it was.
    expect(pdfPictures(bytes)).toMatch(/ 60 +40 /)
    const open = await (
      await PDFDocument.load(bytes, { updateMetadata: false })
    ).save({ useObjectStreams: false })
    expect(Buffer.from(open).toString('latin1')).not.toContain('Marrowby')
    expect(Buffer.from(open).toString('latin1')).not.toContain('xmpmeta')
  })
})

describe('a photograph', () => {
  it('keeps its pixels and loses its notes', async () => {
    const before = await photograph()
    const after = withoutNotes(before)
    expect(Buffer.from(before).includes(author)).toBe(true)
    expect(Buffer.from(after).includes(author)).toBe(false)
    const [one, two] = await Promise.all([before, after].map((bytes) => sharp(bytes).raw().toBuffer()))
    expect(two?.equals(one ?? Buffer.alloc(0))).toBe(true)
  })

  it('that is none is left as it is', () => {
    const other = new Uint8Array([0x89, 0x50, 0x4e, 0x47])
    expect(withoutNotes(other)).toBe(other)
  })
})
