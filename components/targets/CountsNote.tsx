/** Under the hours asked, where they do not count once: a backup adds none, a target of opportunity its own for each trigger. */
export function CountsNote({ times }: { times: number | null }) {
  if (times === null || times === 1) return null
  return (
    <span className="block text-tick text-muted">{times === 0 ? 'not counted' : `each of ${times}`}</span>
  )
}
