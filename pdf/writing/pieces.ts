import { citationMark } from '@/lib/writing/citations'
import type { Inline } from '@/lib/writing/tree'
import { formulaKey, type FormulaShape } from './formulaShape'
import type { Setting } from './setting'

export interface Look {
  bold: boolean
  italic: boolean
}

export type Piece =
  ({ kind: 'text'; text: string } & Look) | { kind: 'formula'; shape: FormulaShape } | { kind: 'break' }

const plain: Look = { bold: false, italic: false }

const textOf = (inlines: readonly Inline[]): string =>
  inlines.map((one) => ('text' in one ? one.text : 'inlines' in one ? textOf(one.inlines) : '')).join('')

/** Inlines as pieces of print, in order: citations and figures by number, addresses in full, formulas as outlines. */
export function piecesOf(inlines: readonly Inline[], setting: Setting, look: Look = plain): Piece[] {
  const words = (text: string): Piece[] => [{ kind: 'text', text, ...look }]
  return inlines.flatMap((inline): Piece[] => {
    switch (inline.kind) {
      case 'text':
      case 'code':
        return words(inline.text)
      case 'strong':
        return piecesOf(inline.inlines, setting, { ...look, bold: true })
      case 'emphasis':
        return piecesOf(inline.inlines, setting, { ...look, italic: true })
      case 'link': {
        const said = textOf(inline.inlines)
        const address = inline.href.replace(/^mailto:/, '')
        return said === address
          ? words(address)
          : [...piecesOf(inline.inlines, setting, look), ...words(` (${address})`)]
      }
      case 'cite':
        return words(citationMark(inline.keys, setting.citations))
      case 'figure': {
        const number = setting.figures.get(inline.label)
        return words(number ? `Figure\u00a0${number}` : `[@fig:${inline.label}]`)
      }
      case 'formula': {
        const shape = setting.shapes.get(formulaKey(inline.tex, false))
        return shape ? [{ kind: 'formula', shape }] : words(inline.tex)
      }
      case 'break':
        return [{ kind: 'break' }]
    }
  })
}

/** Pieces that must not be parted, with whether a space follows. */
export interface Atom {
  pieces: Piece[]
  spaced: boolean
}

/** Pieces cut at their spaces, so that lines can be broken between them. */
export function atomsOf(pieces: readonly Piece[]): Atom[] {
  const atoms: Atom[] = []
  let open: Piece[] = []
  const close = (spaced: boolean) => {
    const last = atoms.at(-1)
    if (open.length > 0) atoms.push({ pieces: open, spaced })
    else if (spaced && last) last.spaced = true
    open = []
  }
  for (const piece of pieces) {
    if (piece.kind === 'break') {
      close(false)
      atoms.push({ pieces: [piece], spaced: false })
    } else if (piece.kind === 'formula') open.push(piece)
    else
      for (const part of piece.text.split(/([ \t\n]+)/)) {
        if (/^[ \t\n]+$/.test(part)) close(true)
        else if (part) open.push({ ...piece, text: part })
      }
  }
  close(false)
  return atoms
}
