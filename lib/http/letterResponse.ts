/** The HTML of a letter to be looked at in a frame of ours: nothing in it runs or loads, and it is no page of ours. */
export function letterResponse(html: string): Response {
  return new Response(html, {
    headers: {
      'content-type': 'text/html; charset=utf-8',
      'content-security-policy':
        "sandbox; default-src 'none'; style-src 'unsafe-inline'; base-uri 'none'; form-action 'none'; frame-ancestors 'self'",
      'cache-control': 'private, no-store',
    },
  })
}
