import { TextLink } from '@/components/ui/TextLink'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { AnonymousProposal } from '@/lib/domain/packets/anonymise'
import { ChecksList } from './ChecksList'
import { TargetsTable } from './TargetsTable'
import { TimeTable } from './TimeTable'
import { UpTable } from './UpTable'

/** What was computed and checked when the proposal was sent, frozen. */
export function ChecksPane({ proposal, reportHref }: { proposal: AnonymousProposal; reportHref: string }) {
  const parts = [
    { id: 'targets', title: 'Targets', content: <TargetsTable proposal={proposal} /> },
    { id: 'checks', title: 'Checks', content: <ChecksList proposal={proposal} /> },
    { id: 'up', title: 'When they are up', content: <UpTable proposal={proposal} /> },
    { id: 'time', title: 'Time asked', content: <TimeTable proposal={proposal} /> },
  ]
  return (
    <div className="flex flex-col gap-10">
      <p className="m-0 text-table">
        <TextLink href={reportHref}>The report in full</TextLink>, with its charts, each observation by
        itself.
      </p>
      {parts.map(({ id, title, content }) => (
        <section key={id} id={id} aria-labelledby={`${id}-title`}>
          <SectionHeading id={`${id}-title`} title={title} />
          <div className="mt-3">{content}</div>
        </section>
      ))}
    </div>
  )
}
