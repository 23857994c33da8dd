/** A text of XML, or of another media type, made for one asking. */
export function textResponse(text: string, mediaType: string): Response {
  return new Response(text, {
    headers: { 'content-type': `${mediaType}; charset=utf-8`, 'cache-control': 'no-store' },
  })
}
