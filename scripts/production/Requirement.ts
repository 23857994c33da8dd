/** One setting that production needs, or must not have. */
export interface Requirement {
  name: string
  /** What the setting is for, in words for whoever runs the server. */
  purpose: string
  /** What is wrong with the value, as the end of a sentence; null when it is good. */
  check: (value: string) => string | null
}

/** Whether the address names this machine itself. */
export function isLoopback(url: URL): boolean {
  return ['127.0.0.1', 'localhost', '[::1]'].includes(url.hostname)
}

export function parseUrl(value: string): URL | null {
  return URL.canParse(value) ? new URL(value) : null
}

/** HTTPS, or plain HTTP to this machine, where nobody listens on the way. */
export function privateHttp(value: string): string | null {
  const url = parseUrl(value)
  if (!url || (url.protocol !== 'https:' && url.protocol !== 'http:')) return 'is not a web address'
  return url.protocol === 'https:' || isLoopback(url)
    ? null
    : 'uses http; only https keeps what is sent private'
}

/** Long enough, and not one character over and over, nor a word for filling in later. */
export function strongSecret(value: string): string | null {
  if (value.length < 32) return 'is shorter than 32 characters (make one with `openssl rand -base64 32`)'
  if (new Set(value).size < 10 || /change.?me|secret|password|example/i.test(value)) {
    return 'looks like a placeholder (make one with `openssl rand -base64 32`)'
  }
  return null
}

export function atLeast(length: number): (value: string) => string | null {
  return (value) => (value.length < length ? `is shorter than ${length} characters` : null)
}
