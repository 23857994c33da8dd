import type { Block, Inline } from '@/lib/writing/tree'
import { escapeHtml } from './escapeHtml'
import { inlineText } from './blocksText'

const gap = 'margin:0 0 16px'
const cellStyle = 'padding:8px 24px 7px 0;border-bottom:1px solid #DDD7C8;text-align:left'

function inlineHtml(node: Inline): string {
  switch (node.kind) {
    case 'strong':
      return `<strong>${inlinesHtml(node.inlines)}</strong>`
    case 'emphasis':
      return `<em>${inlinesHtml(node.inlines)}</em>`
    case 'code':
      return `<code>${escapeHtml(node.text)}</code>`
    case 'link':
      return `<a href="${escapeHtml(node.href)}" style="color:#3B2F6B">${inlinesHtml(node.inlines)}</a>`
    case 'break':
      return '<br>'
    default:
      return escapeHtml(inlineText(node))
  }
}

const inlinesHtml = (list: readonly Inline[]): string => list.map(inlineHtml).join('')

function tableHtml(rows: readonly (readonly (readonly Inline[])[])[]): string {
  const body = rows.map((row, at) => {
    const cells = row.map((cell) => {
      const tag = at === 0 ? 'th' : 'td'
      return `<${tag} style="${cellStyle}">${inlinesHtml(cell)}</${tag}>`
    })
    return `<tr>${cells.join('')}</tr>`
  })
  return `<table style="border-collapse:collapse;${gap};border-top:1.5px solid #171C2B">${body.join('')}</table>`
}

function blockHtml(node: Block): string {
  switch (node.kind) {
    case 'heading':
      return `<p style="${gap};font-size:19px;font-weight:600">${inlinesHtml(node.inlines)}</p>`
    case 'paragraph':
      return `<p style="${gap}">${inlinesHtml(node.inlines)}</p>`
    case 'list': {
      const items = node.items.map((item) => `<li>${blocksHtml(item)}</li>`).join('')
      return node.start === null
        ? `<ul style="${gap};padding-left:24px">${items}</ul>`
        : `<ol start="${node.start}" style="${gap};padding-left:24px">${items}</ol>`
    }
    case 'quote':
      return `<blockquote style="${gap};padding-left:16px;border-left:4px solid #DDD7C8">${blocksHtml(node.blocks)}</blockquote>`
    case 'code':
      return `<pre style="${gap};white-space:pre-wrap">${escapeHtml(node.text)}</pre>`
    case 'formula':
      return `<p style="${gap}">${escapeHtml(node.tex)}</p>`
    case 'table':
      return tableHtml(node.rows)
    case 'rule':
      return '<hr style="border:0;border-top:1px solid #DDD7C8;margin:0 0 16px">'
  }
}

/** A text as the HTML of a letter, styled in place as mail programs want it; every word is escaped. */
export const blocksHtml = (blocks: readonly Block[]): string => blocks.map(blockHtml).join('')
