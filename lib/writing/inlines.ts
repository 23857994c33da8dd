import type { PhrasingContent } from 'mdast'
import 'mdast-util-math'
import { marksIn } from './marks'
import type { Inline } from './tree'

const isSafe = (url: string) => /^(https?:\/\/|mailto:)[^\s]+$/i.test(url)
const lineOf = (node: PhrasingContent) => node.position?.start.line ?? 1

function inlineOf(node: PhrasingContent): Inline[] {
  switch (node.type) {
    case 'text':
      return marksIn(node.value, lineOf(node))
    case 'strong':
    case 'emphasis':
      return [{ kind: node.type, inlines: inlinesOf(node.children) }]
    case 'inlineCode':
      return [{ kind: 'code', text: node.value }]
    case 'inlineMath':
      return [{ kind: 'formula', tex: node.value, line: lineOf(node) }]
    case 'link':
      return isSafe(node.url)
        ? [{ kind: 'link', href: node.url, inlines: inlinesOf(node.children) }]
        : inlinesOf(node.children)
    case 'break':
      return [{ kind: 'break' }]
    // Pictures from elsewhere are not fetched: figures are uploaded, and pointed to by their label.
    case 'image':
      return node.alt ? [{ kind: 'text', text: node.alt }] : []
    // Shown as it was typed, never as markup.
    case 'html':
      return [{ kind: 'text', text: node.value }]
    default:
      return 'children' in node ? inlinesOf(node.children) : []
  }
}

/** Words inside a block, in order. */
export function inlinesOf(nodes: readonly PhrasingContent[]): Inline[] {
  return nodes.flatMap(inlineOf)
}
