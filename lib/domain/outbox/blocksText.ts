import type { Block, Inline } from '@/lib/writing/tree'

/** Words of a paragraph as plain text; a link is followed by where it leads. */
export function inlineText(node: Inline): string {
  switch (node.kind) {
    case 'text':
    case 'code':
      return node.text
    case 'strong':
    case 'emphasis':
      return inlinesText(node.inlines)
    case 'link': {
      const words = inlinesText(node.inlines)
      return words === node.href ? words : `${words} (${node.href})`
    }
    case 'formula':
      return `$${node.tex}$`
    case 'cite':
      return `[${node.keys.map((key) => `@${key}`).join('; ')}]`
    case 'figure':
      return `[@fig:${node.label}]`
    case 'break':
      return '\n'
  }
}

const inlinesText = (list: readonly Inline[]): string => list.map(inlineText).join('')

const indented = (text: string, mark: string): string =>
  text
    .split('\n')
    .map((line, at) => (at === 0 ? mark : ' '.repeat(mark.length)) + line)
    .join('\n')

function blockText(node: Block): string {
  switch (node.kind) {
    case 'heading':
    case 'paragraph':
      return inlinesText(node.inlines)
    case 'list':
      return node.items
        .map((item, at) => indented(blocksText(item), node.start === null ? '- ' : `${node.start + at}. `))
        .join('\n')
    case 'quote':
      return blocksText(node.blocks)
        .split('\n')
        .map((line) => `> ${line}`)
        .join('\n')
    case 'code':
      return node.text
    case 'formula':
      return node.tex
    case 'table':
      return node.rows.map((row) => row.map(inlinesText).join(' | ')).join('\n')
    case 'rule':
      return '----'
  }
}

/** A text as plain text, for letters. */
export const blocksText = (blocks: readonly Block[]): string => blocks.map(blockText).join('\n\n')
