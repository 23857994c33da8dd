import type { FakeResponse } from '../web/httpServer'
import { escapeHtml, htmlPage } from '../web/page'
import { money } from './money'
import type { PaymentStore } from './store'

const style = `
table { border-collapse: collapse; width: 100%; }
th, td { text-align: left; padding: .45rem .75rem .45rem 0; border-bottom: 1px solid var(--line); }
th { font-weight: 500; color: var(--quiet); }
`

const words: Record<string, string> = { open: 'waits for payment', complete: 'paid', expired: 'expired' }

/** What has been asked for and paid so far, newest first. */
export function homePage(store: PaymentStore): FakeResponse {
  const sessions = Object.values(store.state.sessions).reverse().slice(0, 100)
  const rows = sessions.map(({ session, lineItems }) => {
    const what = escapeHtml(lineItems.map((line) => line.description).join(', '))
    const link = session.status === 'open' ? `<a href="/pay/${session.id}">${what}</a>` : what
    const when = new Date(session.created * 1000).toISOString().slice(0, 16).replace('T', ' ')
    const amount = money(session.amount_total, session.currency)
    return `<tr><td>${when} UTC</td><td>${link}</td><td>${amount}</td><td>${words[session.status]}</td></tr>`
  })
  const table =
    rows.length > 0
      ? `<table><thead><tr><th>Asked</th><th>For</th><th>Amount</th><th>State</th></tr></thead><tbody>${rows.join('\n')}</tbody></table>`
      : '<p>No payment has been asked for yet.</p>'
  return htmlPage(
    'Test payments',
    `<h1>Test payments</h1>
<p class="quiet">The demo's payments end here. No money moves, and no card is asked for.</p>
${table}`,
    style,
  )
}
