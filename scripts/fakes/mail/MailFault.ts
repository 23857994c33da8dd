export const mailFaultModes = ['ok', 'down', '4xx', '5xx', 'no-mailbox', 'cut-after-data'] as const
export type MailFaultMode = (typeof mailFaultModes)[number]

/** The fault the mail fake shows, for ever or for a number of deliveries. */
export class MailFault {
  #mode: MailFaultMode = 'ok'
  #left = Number.POSITIVE_INFINITY

  set(mode: MailFaultMode, times = Number.POSITIVE_INFINITY): void {
    this.#mode = mode
    this.#left = times
  }

  get mode(): MailFaultMode {
    return this.#mode
  }

  /** True when this fault is to happen now; counts it. */
  strikes(mode: MailFaultMode): boolean {
    if (this.#mode !== mode || mode === 'ok') return false
    this.#left -= 1
    if (this.#left <= 0) this.#mode = 'ok'
    return true
  }
}
