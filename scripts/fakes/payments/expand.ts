import { balanceLine } from './balance'
import type { PaymentStore } from './store'

type Json = null | boolean | number | string | Json[] | { [key: string]: Json }

/** Replaces ids by their objects along paths such as `payment_intent.latest_charge` or `data.charge`. */
export function expanded(store: PaymentStore, object: unknown, paths: readonly string[]): unknown {
  const copy: Json = JSON.parse(JSON.stringify(object))
  for (const path of paths) grow(store, copy, path.split('.'))
  return copy
}

function grow(store: PaymentStore, place: Json, path: readonly string[]): void {
  const [name, ...rest] = path
  if (name === undefined || place === null || typeof place !== 'object') return
  if (Array.isArray(place)) {
    for (const each of place) grow(store, each, path)
    return
  }
  const value = name === 'line_items' ? lineItems(store, place) : lookUp(store, place[name])
  if (value === undefined) return
  place[name] = value
  if (typeof value === 'object') grow(store, value, rest)
}

function lookUp(store: PaymentStore, value: Json | undefined): Json | undefined {
  if (typeof value !== 'string') return value
  const { sessions, intents, charges, refunds } = store.state
  const found =
    sessions[value]?.session ?? intents[value] ?? charges[value] ?? refunds[value] ?? lineOf(store, value)
  return found ? JSON.parse(JSON.stringify(found)) : value
}

function lineOf(store: PaymentStore, id: string): Json | undefined {
  if (!id.startsWith('txn_')) return undefined
  const charge = Object.values(store.state.charges).find((each) => each.balance_transaction === id)
  return charge && balanceLine(charge)
}

function lineItems(store: PaymentStore, session: { [key: string]: Json }): Json | undefined {
  const id = session.id
  const stored = typeof id === 'string' ? store.state.sessions[id] : undefined
  if (!stored) return undefined
  const list = {
    object: 'list',
    data: stored.lineItems,
    has_more: false,
    url: `/v1/checkout/sessions/${id}/line_items`,
  }
  return JSON.parse(JSON.stringify(list))
}
