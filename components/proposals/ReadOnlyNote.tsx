import { BarNote } from '@/components/ui/BarNote'

/** Why nothing can be changed here now; nothing where it can. */
export function ReadOnlyNote({ reason }: { reason: string | null }) {
  if (!reason) return null
  return (
    <div className="mb-6 max-w-prose">
      <BarNote tone="lamp">
        <p className="m-0">{reason}</p>
      </BarNote>
    </div>
  )
}
