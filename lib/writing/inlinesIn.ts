import type { Block, Inline, Written } from './tree'

function within(inlines: readonly Inline[]): Inline[] {
  return inlines.flatMap((inline) => ('inlines' in inline ? [inline, ...within(inline.inlines)] : [inline]))
}

function inBlock(block: Block): Inline[] {
  switch (block.kind) {
    case 'heading':
    case 'paragraph':
      return within(block.inlines)
    case 'list':
      return block.items.flat().flatMap(inBlock)
    case 'quote':
      return block.blocks.flatMap(inBlock)
    case 'table':
      return block.rows.flat().flatMap(within)
    case 'formula':
    case 'code':
    case 'rule':
      return []
  }
}

/** Everything that stands inside the blocks of a text, in reading order, at whatever depth. */
export function inlinesIn(written: Written): Inline[] {
  return written.flatMap(inBlock)
}
