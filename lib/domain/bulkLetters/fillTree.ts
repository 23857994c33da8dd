import type { Block, Inline, Written } from '@/lib/writing/tree'
import { fillFields, type FilledFields } from './fields'

function inline(node: Inline, values: FilledFields): Inline {
  switch (node.kind) {
    case 'text':
    case 'code':
      return { ...node, text: fillFields(node.text, values) }
    case 'strong':
    case 'emphasis':
    case 'link':
      return { ...node, inlines: node.inlines.map((one) => inline(one, values)) }
    default:
      return node
  }
}

function block(node: Block, values: FilledFields): Block {
  const inlines = (list: readonly Inline[]) => list.map((one) => inline(one, values))
  switch (node.kind) {
    case 'heading':
    case 'paragraph':
      return { ...node, inlines: inlines(node.inlines) }
    case 'list':
      return { ...node, items: node.items.map((item) => fillTree(item, values)) }
    case 'quote':
      return { ...node, blocks: fillTree(node.blocks, values) }
    case 'table':
      return { ...node, rows: node.rows.map((row) => row.map(inlines)) }
    default:
      return node
  }
}

/** The fields filled in the words of a text already read: a title with stars in it stays a title with stars. */
export const fillTree = (tree: Written, values: FilledFields): Written =>
  tree.map((one) => block(one, values))
