/**
 * A PDF to be read within our own pages. Its policy lets nothing run or load; `sandbox` is left out because browsers
 * then refuse to show a PDF at all, and what is sent here was rebuilt by us without scripts.
 */
export function inlinePdf(bytes: Uint8Array, fileName: string): Response {
  return new Response(new Uint8Array(bytes), {
    headers: {
      'content-type': 'application/pdf',
      'content-length': String(bytes.byteLength),
      'content-disposition': `inline; filename="${fileName.replace(/[^\w.-]/g, '-')}"`,
      'content-security-policy':
        "default-src 'none'; style-src 'unsafe-inline'; base-uri 'none'; form-action 'none'; frame-ancestors 'self'",
      'cache-control': 'private, no-store',
    },
  })
}
