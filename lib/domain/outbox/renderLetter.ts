import { blocksHtml } from './blocksHtml'
import { blocksText } from './blocksText'
import { escapeHtml as escape } from './escapeHtml'
import type { Letter } from './letter'

const signature = 'Time-allocation office, Quillon Ridge Observatory'
const font = "'Work Sans', 'Helvetica Neue', Arial, sans-serif"

function textOf(letter: Letter): string {
  const facts = letter.facts?.map(([label, value]) => `${label}: ${value}`).join('\n')
  return [
    letter.greeting,
    ...letter.paragraphs,
    letter.blocks && blocksText(letter.blocks),
    facts,
    letter.action && `${letter.action.label}:\n${letter.action.url}`,
    letter.closing,
    signature,
  ]
    .filter(Boolean)
    .join('\n\n')
}

function htmlOf(letter: Letter): string {
  const paragraph = (text: string) => `<p style="margin:0 0 16px">${escape(text)}</p>`
  const facts = letter.facts?.length
    ? `<table role="presentation" style="border-collapse:collapse;margin:0 0 20px;border-top:1.5px solid #171C2B">${letter.facts
        .map(
          ([label, value]) =>
            `<tr><td style="padding:8px 24px 7px 0;border-bottom:1px solid #DDD7C8;color:#565D70">${escape(label)}</td><td style="padding:8px 0 7px;border-bottom:1px solid #DDD7C8;font-weight:600">${escape(value)}</td></tr>`,
        )
        .join('')}</table>`
    : ''
  const action = letter.action
    ? `<p style="margin:0 0 20px"><a href="${escape(letter.action.url)}" style="display:inline-block;background:#3B2F6B;color:#FFFFFF;text-decoration:none;font-weight:600;padding:11px 20px;border-radius:4px">${escape(letter.action.label)}</a></p><p style="margin:0 0 16px;font-size:13px;color:#565D70">Or open ${escape(letter.action.url)}</p>`
    : ''
  return `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>${escape(letter.subject)}</title></head><body style="margin:0;background:#FAF8F3;color:#171C2B;font:16px/24px ${font}"><div style="max-width:600px;margin:0 auto;padding:36px 16px"><p style="margin:0 0 24px;padding:0 0 12px;border-bottom:1.5px solid #171C2B;font-size:19px;font-weight:600">Noctuary</p>${paragraph(letter.greeting)}${letter.paragraphs.map(paragraph).join('')}${blocksHtml(letter.blocks ?? [])}${facts}${action}${letter.closing ? paragraph(letter.closing) : ''}<p style="margin:24px 0 0;color:#565D70;font-size:14px">${signature}</p></div></body></html>`
}

/** The letter as plain text and as HTML; everything that came from people is escaped. */
export function renderLetter(letter: Letter): { text: string; html: string } {
  return { text: textOf(letter), html: htmlOf(letter) }
}
