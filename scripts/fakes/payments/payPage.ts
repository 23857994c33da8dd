import type { FakeResponse } from '../web/httpServer'
import { escapeHtml, htmlPage } from '../web/page'
import { money } from './money'
import type { StoredSession } from './objects'

const style = `
.pay { display: grid; gap: .6rem; max-width: 24rem; }
.pay button { width: 100%; text-align: left; }
.amount { font-size: 2rem; font-weight: 600; margin: 0 0 1rem; }
.badge { display: inline-block; border: 1px solid var(--line); border-radius: 999px; padding: .1rem .8rem; background: #fff; }
`

/** The hosted page: what is paid, and what shall happen. It has no look but its own. */
export function payPage(stored: StoredSession, message: string | null, asksBank: boolean): FakeResponse {
  const { session, lineItems } = stored
  if (session.status !== 'open') return closedPage(stored)
  const lines = lineItems.map((line) => {
    const count = line.quantity > 1 ? `${line.quantity} × ` : ''
    return `<dt>${escapeHtml(count + line.description)}</dt><dd>${money(line.amount_total, line.currency)}</dd>`
  })
  const notice = message === null ? '' : `<p class="notice" role="alert">${escapeHtml(message)}</p>`
  return htmlPage(
    'Test payment',
    `<p><span class="badge">Test payments, no money moves</span></p>
<h1>Pay ${money(session.amount_total, session.currency)}</h1>
<p class="quiet">${session.customer_email ? `For ${escapeHtml(session.customer_email)}. ` : ''}Choose what this payment shall do; no card is asked for.</p>
${notice}
<dl>${lines.join('')}</dl>
<form class="pay" method="post" action="/pay/${session.id}">
${asksBank ? bankButtons() : payButtons()}
</form>`,
    style,
  )
}

function payButtons(): string {
  return [
    button('pays', 'Pay: the card is accepted', 'main'),
    button('declined', 'The card is declined'),
    button('insufficient-funds', 'The card has too little money'),
    button('authentication', 'The bank asks for confirmation first'),
    button('leave', 'Leave without paying'),
    button('run-out', 'Let this page expire'),
  ].join('\n')
}

function bankButtons(): string {
  return `<p>The bank asks: is it you who pays?</p>
${button('approve', 'Confirm the payment', 'main')}
${button('refuse', 'Fail the confirmation')}`
}

function button(outcome: string, text: string, className = ''): string {
  return `<button class="${className}" name="outcome" value="${outcome}">${text}</button>`
}

function closedPage({ session }: StoredSession): FakeResponse {
  const back = session.status === 'complete' ? successUrl(session) : session.cancel_url
  const text =
    session.status === 'complete'
      ? 'This payment has been made. There is nothing more to pay here.'
      : 'This payment page has expired. Nothing was charged.'
  const link = back === null ? '' : `<p><a href="${escapeHtml(back)}">Return to the application</a></p>`
  const page = htmlPage('Test payment', `<h1>${text}</h1>${link}`, style)
  return { ...page, status: session.status === 'complete' ? 200 : 410 }
}

/** Where the person goes after paying; the API's placeholder becomes the session's id. */
export function successUrl(session: StoredSession['session']): string {
  return session.success_url.replaceAll('{CHECKOUT_SESSION_ID}', session.id)
}
