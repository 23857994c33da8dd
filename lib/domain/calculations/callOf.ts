import type { Operation } from './operations'

/** A call as one types it in a shell, to a server at `origin`. The examples hold no single quotes. */
export function callOf({ path, example }: Pick<Operation, 'path' | 'example'>, origin: string): string {
  if (!example) return `curl ${origin}${path}`
  const json = JSON.stringify(example, null, 1).replace(/\s*\n\s*/g, ' ')
  return [`curl ${origin}${path} \\`, `  -H 'content-type: application/json' \\`, `  -d '${json}'`].join('\n')
}
