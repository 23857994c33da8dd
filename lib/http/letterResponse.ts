/** The HTML of a letter, to be looked at in a frame of ours. The proxy gives it a policy under which nothing runs. */
export function letterResponse(html: string): Response {
  return new Response(html, {
    headers: { 'content-type': 'text/html; charset=utf-8', 'cache-control': 'private, no-store' },
  })
}
