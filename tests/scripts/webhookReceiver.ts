import { createServer, type Server } from 'node:http'
import type Stripe from 'stripe'

export const webhookSecret = 'whsec_for_these_tests'

/** A stand-in for the application's webhook address: checks each signature as the application does. */
export class WebhookReceiver {
  readonly accepted: Stripe.Event[] = []
  refused = 0
  /** What to answer to signed events. */
  status = 200
  readonly #server: Server

  private constructor(stripe: Stripe) {
    this.#server = createServer((request, response) => {
      const chunks: Buffer[] = []
      request.on('data', (chunk: Buffer) => chunks.push(chunk))
      request.on('end', () => {
        try {
          const signature = request.headers['stripe-signature'] ?? ''
          const event = stripe.webhooks.constructEvent(Buffer.concat(chunks), signature, webhookSecret)
          if (this.status === 200) this.accepted.push(event)
          response.writeHead(this.status).end()
        } catch {
          this.refused += 1
          response.writeHead(400).end()
        }
      })
    })
  }

  static start(port: number, stripe: Stripe): Promise<WebhookReceiver> {
    const receiver = new WebhookReceiver(stripe)
    return new Promise((resolve) => receiver.#server.listen(port, '127.0.0.1', () => resolve(receiver)))
  }

  types(): string[] {
    return this.accepted.map((event) => event.type)
  }

  close(): Promise<void> {
    this.#server.closeAllConnections()
    return new Promise((resolve) => this.#server.close(() => resolve()))
  }
}
