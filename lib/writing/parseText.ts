import type { BlockContent, DefinitionContent, RootContent } from 'mdast'
import { fromMarkdown } from 'mdast-util-from-markdown'
import { gfmTableFromMarkdown } from 'mdast-util-gfm-table'
import { mathFromMarkdown } from 'mdast-util-math'
import { gfmTable } from 'micromark-extension-gfm-table'
import { math } from 'micromark-extension-math'
import { inlinesOf } from './inlines'
import type { Block, Written } from './tree'

type Node = RootContent | BlockContent | DefinitionContent

const options = {
  extensions: [math(), gfmTable()],
  mdastExtensions: [mathFromMarkdown(), gfmTableFromMarkdown()],
}

const level = (depth: number): 1 | 2 | 3 => (depth === 1 ? 1 : depth === 2 ? 2 : 3)

function blockOf(node: Node): Block[] {
  switch (node.type) {
    case 'heading':
      return [{ kind: 'heading', level: level(node.depth), inlines: inlinesOf(node.children) }]
    case 'paragraph':
      return [{ kind: 'paragraph', inlines: inlinesOf(node.children) }]
    case 'list':
      return [
        {
          kind: 'list',
          start: node.ordered ? (node.start ?? 1) : null,
          items: node.children.map((item) => item.children.flatMap(blockOf)),
        },
      ]
    case 'blockquote':
      return [{ kind: 'quote', blocks: node.children.flatMap(blockOf) }]
    case 'code':
      return [{ kind: 'code', text: node.value }]
    case 'math':
      return [{ kind: 'formula', tex: node.value, line: node.position?.start.line ?? 1 }]
    case 'table':
      return [
        {
          kind: 'table',
          align: (node.align ?? []).map((one) => one ?? null),
          rows: node.children.map((row) => row.children.map((cell) => inlinesOf(cell.children))),
        },
      ]
    case 'thematicBreak':
      return [{ kind: 'rule' }]
    case 'html':
      return [{ kind: 'paragraph', inlines: [{ kind: 'text', text: node.value }] }]
    default:
      return []
  }
}

/**
 * Reads Markdown (CommonMark with tables) and TeX between dollars into a tree of our own. Markup, pictures from
 * elsewhere and addresses that could act are left out by construction: the tree has no place for them.
 */
export function parseText(text: string): Written {
  return fromMarkdown(text, options).children.flatMap(blockOf)
}
