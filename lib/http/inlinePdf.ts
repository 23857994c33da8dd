/** A PDF to be read within our own pages; what is sent here was rebuilt by us without scripts. */
export function inlinePdf(bytes: Uint8Array, fileName: string): Response {
  return new Response(new Uint8Array(bytes), {
    headers: {
      'content-type': 'application/pdf',
      'content-length': String(bytes.byteLength),
      'content-disposition': `inline; filename="${fileName.replace(/[^\w.-]/g, '-')}"`,
      'cache-control': 'private, no-store',
    },
  })
}
