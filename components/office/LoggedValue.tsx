import { ABSENT } from '@/lib/format'
import { loggedWords } from './loggedWords'

export interface LoggedValueProps {
  /** What the logbook holds: JSON, or nothing. */
  json: string
  quiet?: boolean
}

const longest = 120

/** A value of the logbook in words; a long one opens on request. */
export function LoggedValue({ json, quiet = false }: LoggedValueProps) {
  const words = loggedWords(json)
  const look = `[overflow-wrap:anywhere] ${quiet ? 'text-muted' : ''}`
  if (words.length <= longest) return <span className={look}>{words || ABSENT}</span>
  return (
    <details className={look}>
      <summary className="cursor-pointer max-sm:min-h-11">{`${words.slice(0, longest)}…`}</summary>
      <p className="mt-2 mb-0 whitespace-pre-line">{words.replaceAll('; ', '\n')}</p>
    </details>
  )
}
