import { csvText, type CsvValue } from '../format'

/** Answers as JSON or, to `Accept: text/csv`, with the rows alone as CSV. */
export function jsonOrCsv(
  request: Request,
  body: object,
  rows: readonly Readonly<Record<string, unknown>>[],
): Response {
  const headers = { 'cache-control': 'no-store', vary: 'accept' }
  if (!/\btext\/csv\b/.test(request.headers.get('accept') ?? '')) return Response.json(body, { headers })
  const heads = Object.keys(rows[0] ?? {})
  const cell = (value: unknown): CsvValue =>
    value === null || typeof value === 'string' || typeof value === 'number' || typeof value === 'boolean'
      ? value
      : Array.isArray(value)
        ? value.join(' ')
        : ''
  return new Response(
    csvText(
      heads,
      rows.map((row) => heads.map((head) => cell(row[head]))),
    ),
    { headers: { ...headers, 'content-type': 'text/csv; charset=utf-8' } },
  )
}
