import { SectionHeading } from '@/components/ui/SectionHeading'

/** What reviewers wrote, each by number. */
export function SpokenWords({
  title,
  words,
}: {
  title: string
  words: readonly { reviewer: number; body: string }[]
}) {
  return (
    <section>
      <SectionHeading dense title={title} />
      {words.length === 0 ? <p className="mt-2 text-table text-muted">Nothing was written.</p> : null}
      {words.map((one) => (
        <div key={one.reviewer} className="mt-3 flex gap-5 text-table">
          <span className="w-24 shrink-0 whitespace-nowrap text-muted">Reviewer {one.reviewer}</span>
          <p className="m-0 max-w-prose [overflow-wrap:anywhere] whitespace-pre-line">{one.body}</p>
        </div>
      ))}
    </section>
  )
}
