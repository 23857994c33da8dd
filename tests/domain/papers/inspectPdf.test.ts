import { describe, expect, it } from 'vitest'
import { inspectPdf } from '@/lib/domain/papers/inspectPdf'
import { refused } from '../../support/refused'
import { attached, encryptedPdf, inCatalog, launch, pdfWith, script } from '../../support/pdfs'

const sentence = async (bytes: Uint8Array, limit = 4) =>
  (await refused(inspectPdf(bytes, 'quads.pdf', limit))).fieldErrors.file

// Seen to fail: each row, with its check taken out of inspectPdf or its key out of activeContent.
describe('what is kept', () => {
  it('is a plain PDF within its pages', async () => {
    expect(await inspectPdf(await pdfWith(['one', 'two', 'three']), 'quads.pdf', 4)).toEqual({ pages: 3 })
  })

  it('may open on a chosen view, as typesetting programs write it', async () => {
    const opensOnPage = await pdfWith(['one'], (document) => {
      inCatalog('OpenAction', { S: 'GoTo', D: [document.getPage(0).ref, 'Fit'] })(document)
    })
    expect(await inspectPdf(opensOnPage, 'quads.pdf', 4)).toEqual({ pages: 1 })
  })

  it('may have exactly as many pages as the kind allows', async () => {
    expect(await inspectPdf(await pdfWith(['1', '2', '3', '4']), 'quads.pdf', 4)).toEqual({ pages: 4 })
  })
})

describe('what is refused, each for its own reason', () => {
  const picture = new Uint8Array([0xff, 0xd8, 0xff, 0xe0, ...new Array<number>(500).fill(7)])
  it.each<[string, () => Promise<Uint8Array> | Uint8Array, RegExp]>([
    ['nothing', () => new Uint8Array(), /is empty/],
    ['a JPEG named .pdf', () => picture, /not a PDF: by its contents it is a JPEG picture/],
    ['a ZIP named .pdf', () => new Uint8Array([0x50, 0x4b, 3, 4, 0, 0, 0, 0]), /Word document or a ZIP/],
    ['text', () => Buffer.from('<html>'), /something else/],
    [
      'a PDF after something else',
      async () => Buffer.concat([Buffer.from('MZ'), await pdfWith(['a'])]),
      /not a PDF/,
    ],
    ['a PDF cut short', async () => (await pdfWith(['a', 'b'])).subarray(0, 400), /ends in the middle/],
    [
      'a PDF with a tail',
      async () => Buffer.concat([await pdfWith(['a']), Buffer.from('PK tail')]),
      /hangs on the end/,
    ],
    [
      'the head of a PDF alone',
      () => Buffer.from('%PDF-1.7\nnothing\n%%EOF'),
      /cannot be read as one|no pages/,
    ],
    ['a locked PDF', encryptedPdf, /locked with a password/],
    ['a script', () => pdfWith(['a'], script), /carries a script/],
    ['an opening action', () => pdfWith(['a'], launch), /an action/],
    [
      'an opening script',
      () => pdfWith(['a'], inCatalog('OpenAction', { S: 'JavaScript', JS: 'x' })),
      /script|action/,
    ],
    [
      'actions of its own',
      () => pdfWith(['a'], inCatalog('AA', { WC: { S: 'Named' } })),
      /start by themselves/,
    ],
    ['an attached file', () => pdfWith(['a'], attached), /attached file/],
    [
      'five pages of four',
      () => pdfWith(['1', '2', '3', '4', '5']),
      /has 5 pages; this document may have four pages/,
    ],
    ['sixty pages', () => pdfWith(new Array<string>(60).fill('x')), /has 60 pages/],
  ])('%s', async (_, make, words) => {
    expect(await sentence(await make())).toMatch(words)
  })

  it('a file larger than 20 MB, before it is read', async () => {
    const large = new Uint8Array(20_000_001)
    large.set(Buffer.from('%PDF-1.7'))
    expect(await sentence(large)).toMatch(/has 20\.0 MB; at most 20\.0 MB|at most 20/)
  })

  it('a script whose name is spelt in hexadecimal', async () => {
    const text = Buffer.from(await pdfWith(['a'], script, false)).toString('latin1')
    const hidden = Buffer.from(
      text.replaceAll('/JavaScript', '/Java#53cript').replaceAll('/JS', '/J#53'),
      'latin1',
    )
    expect(await sentence(hidden)).toMatch(/script|cannot be read/)
  })
})
