/** A picture we drew anew ourselves, for our own pages; never kept by a shared cache, never a page. */
export function pictureResponse({
  bytes,
  contentType,
}: {
  bytes: Uint8Array
  contentType: 'image/png' | 'image/jpeg'
}): Response {
  return new Response(Buffer.from(bytes), {
    headers: {
      'content-type': contentType,
      'content-length': String(bytes.byteLength),
      'cache-control': 'private, no-cache',
    },
  })
}
