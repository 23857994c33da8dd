import type { FakeResponse } from '../web/httpServer'
import { escapeHtml, htmlPage } from '../web/page'
import { money } from './money'
import type { PaymentStore } from './store'

const style = `
table { border-collapse: collapse; width: 100%; }
th, td { text-align: left; padding: .45rem .75rem .45rem 0; border-bottom: 1px solid var(--line); }
th { font-weight: 500; color: var(--quiet); }
td form { display: flex; flex-wrap: wrap; gap: .35rem; }
td button { padding: .1rem .5rem; font-size: .85rem; }
`

const words: Record<string, string> = { open: 'waits for payment', complete: 'paid', expired: 'expired' }

/** What has been asked for and paid so far, newest first. */
export function homePage(store: PaymentStore): FakeResponse {
  const sessions = Object.values(store.state.sessions).reverse().slice(0, 100)
  const rows = sessions.map(({ session, lineItems, intentId }) => {
    const what = escapeHtml(lineItems.map((line) => line.description).join(', '))
    const link = session.status === 'open' ? `<a href="/pay/${session.id}">${what}</a>` : what
    const when = new Date(session.created * 1000).toISOString().slice(0, 16).replace('T', ' ')
    const amount = money(session.amount_total, session.currency)
    const { standing, deeds } = standingOf(store, intentId, words[session.status] ?? '')
    return `<tr><td>${when} UTC</td><td>${link}</td><td>${amount}</td><td>${standing}</td><td>${form(session.id, deeds)}</td></tr>`
  })
  const table =
    rows.length > 0
      ? `<table><thead><tr><th>Asked</th><th>For</th><th>Amount</th><th>State</th><th>Afterwards</th></tr></thead><tbody>${rows.join('\n')}</tbody></table>`
      : '<p>No payment has been asked for yet.</p>'
  return htmlPage(
    'Test payments',
    `<h1>Test payments</h1>
<p class="quiet">The demo's payments end here. No money moves, and no card is asked for.</p>
${table}`,
    style,
  )
}

/** How a payment stands, and what may still happen to it without the application asking. */
function standingOf(store: PaymentStore, intentId: string | null, plain: string) {
  const intent = intentId === null ? undefined : store.state.intents[intentId]
  const charge = intent?.latest_charge ? store.state.charges[intent.latest_charge] : undefined
  if (!charge?.paid) return { standing: plain, deeds: [] }
  const dispute = Object.values(store.state.disputes).find((each) => each.charge === charge.id)
  const back = charge.amount_refunded > 0 ? `, ${money(charge.amount_refunded, charge.currency)} back` : ''
  const standing = `${plain}${back}${dispute ? `, dispute ${dispute.status.replace('_', ' ')}` : ''}`
  if (dispute?.status === 'needs_response')
    return { standing, deeds: [deed('won', 'Dispute won'), deed('lost', 'Dispute lost')] }
  if (dispute || charge.refunded) return { standing, deeds: [] }
  return { standing, deeds: [deed('open', 'Dispute it'), deed('refund', 'Give back by hand')] }
}

const deed = (name: string, text: string) => `<button name="deed" value="${name}">${text}</button>`

const form = (sessionId: string, deeds: readonly string[]) =>
  deeds.length === 0 ? '' : `<form method="post" action="/after/${sessionId}">${deeds.join('')}</form>`
