/** A text file to be saved. */
export function fileResponse({ text, type, name }: { text: string; type: string; name: string }): Response {
  return new Response(text, {
    headers: {
      'content-type': type,
      'content-disposition': `attachment; filename="${name.replace(/[^\w.-]/g, '-')}"`,
      'cache-control': 'private, no-store',
    },
  })
}
