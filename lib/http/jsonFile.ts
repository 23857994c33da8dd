/** A JSON file to keep. */
export function jsonFile({ fileName, text }: { fileName: string; text: string }): Response {
  return new Response(text, {
    headers: {
      'content-type': 'application/json; charset=utf-8',
      'content-disposition': `attachment; filename="${fileName}"`,
      'cache-control': 'private, no-store',
    },
  })
}
