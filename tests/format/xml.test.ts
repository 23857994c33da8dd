// @vitest-environment jsdom
import { describe, expect, it } from 'vitest'
import { xml, xmlDocument } from '@/lib/format/xml'

const read = (text: string) => new DOMParser().parseFromString(text, 'text/xml')

// Seen to fail with the ampersand, the quote and the control characters let through, one at a time.
describe('XML as written', () => {
  it.each([
    'a < b && c > d ]]>',
    '"quoted" and \'so\'',
    '<script>alert(1)</script>',
    '&amp; stays as typed',
    'lines\nand\ttabs\rand 😀 αβ',
    ' spaces ',
  ])('is read back by a parser as it was: %j', (text) => {
    const document = read(xmlDocument(xml('a', { b: text }, xml('c', {}, text), text)))
    expect(document.querySelector('parsererror')).toBeNull()
    const root = document.documentElement
    expect(root.getAttribute('b')).toBe(text)
    expect(root.children[0]?.textContent).toBe(text)
    expect(root.children).toHaveLength(1)
  })

  it('has a mark where a character has no place in XML', () => {
    const document = read(xmlDocument(xml('a', {}, 'x\u0000\u000B\uD800\uFFFFy')))
    expect(document.documentElement.textContent).toBe('x\uFFFD\uFFFD\uFFFD\uFFFDy')
  })

  it('leaves out attributes that are not there, and closes what is empty', () => {
    expect(xml('a', { b: undefined, c: 0 }).markup).toBe('<a c="0"/>')
    expect(xmlDocument(xml('a', {}))).toBe('<?xml version="1.0" encoding="UTF-8"?>\n<a/>\n')
  })
})
