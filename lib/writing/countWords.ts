import { blocksIn } from './blocksIn'
import type { Block, Inline, Written } from './tree'

const wordsOf = (text: string) => text.match(/[\p{L}\p{N}][^\s]*/gu)?.length ?? 0

/** A run of words broken only by marks of weight is counted as it reads: `re**mark**able` is one word. */
function ownText(inlines: readonly Inline[]): string {
  return inlines
    .map((inline) => {
      switch (inline.kind) {
        case 'text':
        case 'code':
          return inline.text
        case 'strong':
        case 'emphasis':
        case 'link':
          return ownText(inline.inlines)
        case 'break':
          return ' '
        // A formula is one word, whatever its length; a citation and a pointer to a figure are none.
        case 'formula':
          return ' x '
        case 'cite':
        case 'figure':
          return ' '
      }
    })
    .join('')
}

function ownWords(block: Block): number {
  switch (block.kind) {
    case 'heading':
    case 'paragraph':
      return wordsOf(ownText(block.inlines))
    case 'code':
      return wordsOf(block.text)
    case 'formula':
      return 1
    case 'table':
      return block.rows.flat().reduce((sum, cell) => sum + wordsOf(ownText(cell)), 0)
    case 'list':
    case 'quote':
    case 'rule':
      return 0
  }
}

/** Words of a text: headings, lists and tables count, a formula as one word, citations as none. */
export function countWords(written: Written): number {
  return blocksIn(written).reduce((sum, block) => sum + ownWords(block), 0)
}
