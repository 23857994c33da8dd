import type { FakeResponse } from '../web/httpServer'
import { escapeHtml, htmlPage } from '../web/page'
import type { Letter } from './letterbox'
import type { MailFaultMode } from './MailFault'

const listStyle = `
.rows a { display: grid; grid-template-columns: 1fr auto; gap: 0 1rem; padding: .7rem .25rem; color: inherit; text-decoration: none; }
.rows a:hover { background: #fff; }
.rows .subject { font-weight: 600; }
.rows .who, .rows time { color: var(--quiet); font-size: .9rem; }
`

export function inboxPage(letters: readonly Letter[], to: string, fault: MailFaultMode): FakeResponse {
  const title = to ? `Letters to ${to}` : 'Letters'
  const trouble = fault === 'ok' ? '' : `<p class="notice">A fault is switched on: ${escapeHtml(fault)}.</p>`
  const rows = letters.map(
    (letter) => `<li><a href="/messages/${letter.id}">
<span class="subject">${escapeHtml(letter.subject || 'No subject')}</span>${when(letter)}
<span class="who">to ${escapeHtml(letter.envelopeTo.join(', '))}</span></a></li>`,
  )
  const list = rows.length > 0 ? `<ul class="rows">${rows.join('\n')}</ul>` : '<p>No letters yet.</p>'
  const all = to ? ' <a href="/">Show all letters</a>' : ''
  const page = htmlPage(
    `${title} (${letters.length})`,
    `<h1>${escapeHtml(title)}</h1>
<p class="quiet">Every letter the demo sends ends here; none leaves this machine.${all}</p>${trouble}
${list}`,
    listStyle,
  )
  return { ...page, headers: { ...page.headers, refresh: '10' } }
}

export function letterPage(letter: Letter): FakeResponse {
  const attachments = letter.attachments.map(({ filename, size }) => `${filename} (${size} bytes)`).join(', ')
  const html = letter.html
    ? `<h2>As formatted</h2>
<iframe sandbox="allow-popups allow-popups-to-escape-sandbox" src="/messages/${letter.id}/html" title="The letter as formatted"></iframe>`
    : ''
  return htmlPage(
    letter.subject || 'No subject',
    `<p><a href="/">All letters</a></p>
<h1>${escapeHtml(letter.subject || 'No subject')}</h1>
<dl>
<dt>From</dt><dd>${escapeHtml(letter.from)}</dd>
<dt>To</dt><dd><a href="/?to=${encodeURIComponent(letter.envelopeTo[0] ?? '')}">${escapeHtml(letter.envelopeTo.join(', '))}</a></dd>
<dt>Received</dt><dd>${when(letter)}</dd>
${attachments ? `<dt>Attached</dt><dd>${escapeHtml(attachments)}</dd>` : ''}
</dl>
<pre>${withLinks(letter.text)}</pre>
${html}
<p><a href="/messages/${letter.id}/raw">The message as it was sent</a></p>`,
    'h2 { font-size: 1.1rem; }',
  )
}

/** The letter's own HTML, locked in: no scripts, no forms, no fetching; links open in a new tab. */
export function letterHtml(letter: Letter): FakeResponse {
  return {
    status: 200,
    headers: {
      'content-type': 'text/html; charset=utf-8',
      'content-security-policy':
        "sandbox allow-popups allow-popups-to-escape-sandbox; default-src 'none'; style-src 'unsafe-inline'; img-src data:",
    },
    body: `<base target="_blank">${letter.html}`,
  }
}

function when(letter: Letter): string {
  const text = `${letter.receivedAt.slice(0, 10)} ${letter.receivedAt.slice(11, 19)} UTC`
  return `<time datetime="${letter.receivedAt}">${text}</time>`
}

function withLinks(text: string): string {
  return escapeHtml(text).replace(
    /https?:\/\/[^\s<>)\]]+/g,
    (address) => `<a href="${address}" target="_blank" rel="noreferrer">${address}</a>`,
  )
}
