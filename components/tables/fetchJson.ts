import type { z } from 'zod'

const sentence = (body: unknown): string | null =>
  typeof body === 'object' && body !== null && 'detail' in body && typeof body.detail === 'string'
    ? body.detail
    : null

/** Fetches JSON of a known shape. A refusal's own sentence (`detail` of its problem body) becomes the error's message. */
export async function fetchJson<Reply>(
  url: string,
  schema: z.ZodType<Reply>,
  signal?: AbortSignal,
): Promise<Reply> {
  const response = await fetch(url, { headers: { accept: 'application/json' }, signal })
  const body: unknown = await response.json().catch(() => null)
  if (!response.ok)
    throw new Error(sentence(body) ?? 'The observatory did not answer as it should. Try again.')
  return schema.parse(body)
}
