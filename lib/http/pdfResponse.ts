/** A PDF as a download: never shown inside our own pages, never kept by a shared cache. */
export function pdfResponse({ bytes, fileName }: { bytes: Uint8Array; fileName: string }): Response {
  return new Response(Buffer.from(bytes), {
    headers: {
      'content-type': 'application/pdf',
      'content-length': String(bytes.byteLength),
      'content-disposition': `attachment; filename="${fileName.replace(/[^A-Za-z0-9._-]/g, '-')}"`,
      'cache-control': 'private, no-store',
    },
  })
}
