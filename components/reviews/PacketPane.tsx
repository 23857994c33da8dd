import { TextLink } from '@/components/ui/TextLink'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { InstrumentAssessment } from '@/lib/domain/assessments/types'
import type { AnonymousProposal } from '@/lib/domain/packets/anonymise'
import { instrumentWords } from '@/lib/domain/reviews/instrumentWords'
import { formatHoursFromSeconds, formatNumber } from '@/lib/format'
import { AssessmentNote } from './AssessmentNote'
import { PacketFrame } from './PacketFrame'

export interface PacketPaneProps {
  proposal: AnonymousProposal
  assessments: readonly (InstrumentAssessment & { panelNote: string })[]
  packetUrl: string
}

const sections = [
  ['justification', 'Justification'],
  ['targets', 'Targets'],
  ['checks', 'Checks'],
  ['up', 'When they are up'],
  ['time', 'Time asked'],
] as const

/** What is judged, without names: the facts in one line, the abstract, the packet itself. */
export function PacketPane({ proposal, assessments, packetUrl }: PacketPaneProps) {
  const { computation, modes } = proposal
  const instruments = instrumentWords(
    modes.map(({ instrument, telescope }) => ({ instrument: instrument.name, telescope: telescope.name })),
  )
  return (
    <div>
      <div className="flex h-12 items-stretch justify-between gap-6 border-b border-rule text-table max-lg:hidden">
        <ul className="plain-list flex items-center gap-6">
          {sections.map(([id, label]) => (
            <li key={id}>
              <a href={`#${id}`} className="text-muted no-underline hover:text-ink hover:underline">
                {label}
              </a>
            </li>
          ))}
        </ul>
        <span className="flex items-center">
          <TextLink href={packetUrl} plain>
            Packet as PDF
          </TextLink>
        </span>
      </div>
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1 pb-4 text-table lg:pt-4">
        <strong className="font-semibold max-lg:hidden">
          {formatHoursFromSeconds(computation.askedSeconds)}, {instruments}
        </strong>
        <span>
          {formatNumber(proposal.targets.length)} {proposal.targets.length === 1 ? 'target' : 'targets'}
        </span>
        {assessments.map(({ instrumentId, instrument, verdict }) => (
          <VerdictMark
            key={instrumentId}
            verdict={verdict}
            words={`${instrument}: ${verdict.replace('-', ' ')}`}
          />
        ))}
        {computation.verdict ? (
          <VerdictMark
            verdict={computation.verdict}
            words={`computed: ${computation.verdict.replace('-', ' ')}, ${computation.checksClear} of ${computation.checksTotal}`}
          />
        ) : null}
      </div>
      <section id="justification" aria-labelledby="packet-title">
        <h1 id="packet-title" className="text-title [overflow-wrap:anywhere] max-sm:text-h2">
          {proposal.title}
        </h1>
        <p className="mt-1 text-table text-muted">
          {proposal.kind.title} · {proposal.category}
        </p>
        <p className="mt-4 max-w-prose whitespace-pre-line">{proposal.abstract}</p>
        {assessments.map((assessment) => (
          <AssessmentNote key={assessment.instrumentId} assessment={assessment} />
        ))}
        <PacketFrame url={packetUrl} label={`Packet of ${proposal.reviewNumber ?? 'this proposal'}`} />
      </section>
    </div>
  )
}
