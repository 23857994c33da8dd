import type { Block, Written } from './tree'

/** Every block of a text, also those in lists and quotations, in reading order. */
export function blocksIn(written: Written): Block[] {
  return written.flatMap((block) => {
    if (block.kind === 'list') return [block, ...blocksIn(block.items.flat())]
    if (block.kind === 'quote') return [block, ...blocksIn(block.blocks)]
    return [block]
  })
}
