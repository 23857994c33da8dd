import { describe, expect, it } from 'vitest'
import { citationMark, citationsOf } from '@/lib/writing/citations'
import { countWords } from '@/lib/writing/countWords'
import { unknownFigures } from '@/lib/writing/unknownFigures'
import { formulasIn } from '@/lib/writing/formulasIn'
import { mathMl } from '@/lib/writing/mathMl'
import { parseText } from '@/lib/writing/parseText'
import type { Reference } from '@/lib/writing/references'

// Seen to fail: with html passed on, with every address let through, with marks left in the words.
describe('a text as it is read', () => {
  it('has headings, weight, lists, tables and formulas, and lines for what can be wrong', () => {
    const text = '# Why\n\nA **bold** claim at $z = 2$\nof [@a_b; @c].\n\n$$\nE = mc^2\n$$\n\n- one\n- two'
    expect(parseText(text)).toEqual([
      { kind: 'heading', level: 1, inlines: [{ kind: 'text', text: 'Why' }] },
      {
        kind: 'paragraph',
        inlines: [
          { kind: 'text', text: 'A ' },
          { kind: 'strong', inlines: [{ kind: 'text', text: 'bold' }] },
          { kind: 'text', text: ' claim at ' },
          { kind: 'formula', tex: 'z = 2', line: 3 },
          { kind: 'text', text: '\nof ' },
          { kind: 'cite', keys: ['a_b', 'c'], line: 4 },
          { kind: 'text', text: '.' },
        ],
      },
      { kind: 'formula', tex: 'E = mc^2', line: 6 },
      {
        kind: 'list',
        start: null,
        items: [
          [{ kind: 'paragraph', inlines: [{ kind: 'text', text: 'one' }] }],
          [{ kind: 'paragraph', inlines: [{ kind: 'text', text: 'two' }] }],
        ],
      },
    ])
    expect(parseText('| a | b |\n| - | -: |\n| 1 | 2 |')).toMatchObject([
      {
        kind: 'table',
        align: [null, 'right'],
        rows: [
          [[{ text: 'a' }], [{ text: 'b' }]],
          [[{ text: '1' }], [{ text: '2' }]],
        ],
      },
    ])
  })

  it.each([
    '<script>alert(1)</script>',
    'x <img src=x onerror=alert(1)> y',
    '[go](javascript:alert(1))',
    '[go](data:text/html,hello)',
    '![there](https://far.example/pixel.png)',
  ])('carries nothing that could act: %s', (text) => {
    const tree = JSON.stringify(parseText(text))
    expect(tree).not.toMatch(/"href"|"src"|"html"/)
    expect(tree).toContain('"text"')
  })

  it('keeps an address of the web', () => {
    expect(parseText('[page](https://a.example/x)')).toMatchObject([
      { inlines: [{ kind: 'link', href: 'https://a.example/x', inlines: [{ text: 'page' }] }] },
    ])
  })

  it('leaves words in square brackets that are no marks', () => {
    expect(parseText('see [O III] and [@ home] and [@fig:a; @b]')).toEqual([
      { kind: 'paragraph', inlines: [{ kind: 'text', text: 'see [O III] and [@ home] and [@fig:a; @b]' }] },
    ])
  })
})

// Seen to fail: with formulas counted by their letters, with lists left out.
describe('words of a text', () => {
  it.each([
    ['', 0],
    ['one two', 2],
    ['re**mark**able', 1],
    ['at $z = 2.3 \\pm 0.1$ we', 3],
    ['$$\na + b\n$$', 1],
    ['# Head\n\n- a b\n- c\n\n> d', 5],
    ['known [@a; @b] and [@fig:one] seen', 3],
    ['a — b', 2],
    ['| a | b |\n|-|-|\n| c d | |', 4],
    ['größer Å 10^42 5″', 4],
  ])('%j has %i', (text, words) => expect(countWords(parseText(text))).toBe(words))
})

describe('formulas', () => {
  it('are listed by line, whether inside a paragraph or alone', () => {
    expect(formulasIn(parseText('$$\na\n$$\n\nb $c$\n\n- $d$'))).toEqual([
      { tex: 'a', display: true, line: 1 },
      { tex: 'c', display: false, line: 5 },
      { tex: 'd', display: false, line: 7 },
    ])
  })

  // Seen to fail: with the output of both kinds, which needs styles.
  it('become MathML without style, class of its own fonts or script', () => {
    const set = mathMl('\\frac{\\Delta T}{T} \\propto D_L^{-2}', true)
    expect(set.ok && set.mathMl).toContain('<mfrac>')
    expect(set.ok && set.mathMl).toContain('display="block"')
    expect(set.ok && set.mathMl).not.toMatch(/style=|<script|katex-html/)
  })

  it.each([
    ['\\frac{1}', /^Unexpected end of input in a macro argument/],
    ['\\nosuch', /^Undefined control sequence: \\nosuch\.$/],
    ['x^{', /^Expected/],
    [' ', /empty/],
    ['x'.repeat(2001), /at most 2000/],
    ['\\def\\a{\\a}\\a', /^Too many expansions/],
  ])('say what is wrong with %j', (tex, problem) => {
    const set = mathMl(tex, false)
    expect(set.ok ? '' : set.problem).toMatch(problem)
  })

  it.each([
    '\\href{javascript:alert(1)}{x}',
    '\\htmlStyle{color:red}{x}',
    '\\includegraphics{https://far.example/x.png}',
  ])('cannot reach out: %s', (tex) => {
    const set = mathMl(tex, false)
    expect(set.ok ? set.mathMl : '').not.toMatch(/href=|style=|<img|src=/)
  })
})

const reference = (key: string): Reference => ({
  key,
  line: 1,
  authors: [],
  year: '2026',
  title: key,
  where: '',
  doi: '',
})

// Seen to fail: with numbers given in the order of the list.
describe('citations', () => {
  it('are numbered as they are first met; what is not in the list, and what nobody cites, is told', () => {
    const found = citationsOf(parseText('x [@b; @a] y\n\n[@b; @zz]'), ['a', 'b', 'c'].map(reference))
    expect([...found.numbers]).toEqual([
      ['b', 1],
      ['a', 2],
    ])
    expect(found.cited.map(({ key }) => key)).toEqual(['b', 'a'])
    expect(found.unknown).toEqual([{ key: 'zz', line: 3 }])
    expect(found.uncited.map(({ key }) => key)).toEqual(['c'])
    expect(citationMark(['b', 'zz'], found.numbers)).toBe('[1, @zz]')
  })

  it('leaves figures apart', () => {
    const tree = parseText('[@fig:map] and [@fig:fit]\n\n[@fig:fit], [@map]')
    expect(unknownFigures(tree, ['map'])).toEqual([{ label: 'fit', line: 1 }])
  })
})
