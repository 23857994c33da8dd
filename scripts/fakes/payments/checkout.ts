import { invalid, missing } from './ApiError'
import { integerOf, listOf, metadataOf, textOf, treeOf, type FormTree, type FormValue } from './form'
import type { CheckoutSession, LineItem, StoredSession } from './objects'
import { newId, unixNow, type PaymentStore } from './store'

const halfHour = 30 * 60
const day = 24 * 60 * 60

/** POST /v1/checkout/sessions: payment mode, hosted page, prices given in the request. */
export function createSession(store: PaymentStore, form: FormTree, pageBase: string): CheckoutSession {
  const mode = textOf(form, 'mode')
  if (mode !== 'payment')
    throw invalid('This mock knows only mode=payment.', 'mode', 'parameter_invalid_string')
  const uiMode = textOf(form, 'ui_mode')
  if (uiMode !== null && uiMode !== 'hosted_page')
    throw invalid('This mock knows only ui_mode=hosted_page.', 'ui_mode')
  const lines = listOf(form, 'line_items')
  if (lines.length === 0)
    throw invalid('Missing required param: line_items.', 'line_items', 'parameter_missing')
  const lineItems = lines.map(readLine)
  const currencies = new Set(lineItems.map((line) => line.currency))
  const [currency] = currencies
  if (!currency || currencies.size > 1)
    throw invalid('All line items must have the same currency.', 'line_items')
  const total = lineItems.reduce((sum, line) => sum + line.amount_total, 0)
  if (total < 50)
    throw invalid('The amount is below the smallest that can be charged.', 'line_items', 'amount_too_small')

  const now = unixNow()
  const id = newId('cs_test')
  const session: CheckoutSession = {
    id,
    object: 'checkout.session',
    amount_subtotal: total,
    amount_total: total,
    automatic_tax: { enabled: false, liability: null, provider: null, status: null },
    cancel_url: readUrl(form, 'cancel_url'),
    client_reference_id: textOf(form, 'client_reference_id'),
    created: now,
    currency,
    custom_fields: [],
    customer: null,
    customer_creation: 'if_required',
    customer_details: null,
    customer_email: readEmail(form),
    expires_at: readExpiry(form, now),
    invoice: null,
    livemode: false,
    locale: textOf(form, 'locale'),
    metadata: metadataOf(form),
    mode: 'payment',
    payment_intent: null,
    payment_link: null,
    payment_method_types: ['card'],
    payment_status: 'unpaid',
    shipping_options: [],
    status: 'open',
    subscription: null,
    success_url: requiredUrl(form, 'success_url'),
    total_details: { amount_discount: 0, amount_shipping: 0, amount_tax: 0 },
    ui_mode: 'hosted_page',
    url: `${pageBase}/pay/${id}`,
  }
  const intentData = treeOf(form, 'payment_intent_data')
  const stored: StoredSession = {
    session,
    lineItems,
    intentId: null,
    intentMetadata: metadataOf(intentData),
    intentDescription: textOf(intentData, 'description'),
  }
  store.state.sessions[id] = stored
  store.changed()
  return session
}

export function findSession(store: PaymentStore, id: string): StoredSession {
  const stored = store.state.sessions[id]
  if (!stored) throw missing('checkout.session', id)
  return stored
}

function readLine(value: FormValue, index: number): LineItem {
  const at = `line_items[${index}]`
  if (typeof value !== 'object' || Array.isArray(value)) throw invalid('Invalid object', at)
  const price = textOf(value, 'price')
  if (price !== null) throw invalid(`No such price: '${price}'`, `${at}[price]`, 'resource_missing')
  const priceData = treeOf(value, 'price_data')
  const quantity = integerOf(value, 'quantity') ?? 1
  const unitAmount = integerOf(priceData, 'unit_amount')
  const currency = textOf(priceData, 'currency')?.toLowerCase()
  const name = textOf(treeOf(priceData, 'product_data'), 'name')
  if (!currency || !/^[a-z]{3}$/.test(currency))
    throw invalid('Invalid currency', `${at}[price_data][currency]`)
  if (unitAmount === null || unitAmount < 0) throw invalid('Invalid amount', `${at}[price_data][unit_amount]`)
  if (quantity < 1) throw invalid('Invalid quantity', `${at}[quantity]`)
  if (!name)
    throw invalid(
      'Missing required param: name',
      `${at}[price_data][product_data][name]`,
      'parameter_missing',
    )
  const amount = unitAmount * quantity
  return {
    id: newId('li'),
    object: 'item',
    amount_subtotal: amount,
    amount_total: amount,
    amount_discount: 0,
    amount_tax: 0,
    currency,
    description: name,
    quantity,
    price: { id: newId('price'), object: 'price', currency, unit_amount: unitAmount, type: 'one_time' },
  }
}

function readExpiry(form: FormTree, now: number): number {
  const wish = integerOf(form, 'expires_at')
  if (wish === null) return now + day
  // A minute's leeway, as clocks differ.
  if (wish < now + halfHour - 60 || wish > now + day + 60) {
    throw invalid('expires_at must be between 30 minutes and 24 hours from now.', 'expires_at')
  }
  return wish
}

function readEmail(form: FormTree): string | null {
  const email = textOf(form, 'customer_email')
  if (email !== null && !/^[^\s@]+@[^\s@]+$/.test(email)) {
    throw invalid(`Invalid email address: ${email}`, 'customer_email', 'email_invalid')
  }
  return email
}

function readUrl(form: FormTree, name: string): string | null {
  const text = textOf(form, name)
  if (text !== null && !/^https?:\/\//.test(text)) throw invalid('Not a valid URL', name, 'url_invalid')
  return text
}

function requiredUrl(form: FormTree, name: string): string {
  const text = readUrl(form, name)
  if (text === null) throw invalid(`Missing required param: ${name}.`, name, 'parameter_missing')
  return text
}
