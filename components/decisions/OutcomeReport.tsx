import { TwoColumns } from '@/components/layout/TwoColumns'
import { Facts } from '@/components/ui/Facts'
import { Panel } from '@/components/ui/Panel'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { OutcomeView } from '@/lib/domain/decisions/readOutcome'
import { formatHoursFromSeconds, formatNumber } from '@/lib/format'
import { outcomeWords } from './outcomeWords'

type Decision = NonNullable<OutcomeView['decision']>

function AwardList({ decision }: { decision: Decision }) {
  const counted = decision.lines.filter((line) => !line.isReserve)
  const total = counted.reduce((sum, line) => sum + line.seconds, 0)
  if (decision.lines.length === 0) return null
  return (
    <Facts
      title="Hours"
      facts={[
        ...decision.lines.map((line) => ({
          term: (
            <>
              {line.instrument}, {line.telescope}
              {line.isReserve ? ', in reserve' : ''}
              {line.service === 'visitor' ? ', visitor' : ', queue'}
              {line.evenings ? <span className="block">{line.evenings}</span> : null}
              {line.conditions ? <span className="block">{line.conditions}</span> : null}
            </>
          ),
          value: <span className="whitespace-nowrap">{formatHoursFromSeconds(line.seconds)}</span>,
        })),
        {
          term: 'Awarded',
          value: `${formatNumber(total / 3600, 1)} of ${formatHoursFromSeconds(decision.askedSeconds)} asked`,
          total: true,
        },
      ]}
    />
  )
}

/** The decision as investigators read it: the word, the hours, the statement, unsigned comments, the assessment. */
export function OutcomeReport({ reference, decision }: { reference: string; decision: Decision }) {
  const words = outcomeWords[decision.outcome]
  return (
    <TwoColumns side={<AwardList decision={decision} />}>
      <Panel bar={words.bar} aside={reference} title={words.title}>
        <p className="m-0 max-w-prose">{words.sentence}</p>
      </Panel>
      <section className="mt-10">
        <SectionHeading title="What the panel says" />
        <p className="mt-3 max-w-prose [overflow-wrap:anywhere] whitespace-pre-line">{decision.statement}</p>
      </section>
      {decision.assessments.length > 0 ? (
        <section className="mt-10">
          <SectionHeading title="What the instrument staff say" />
          {decision.assessments.map((one) => (
            <div key={one.instrument} className="mt-3 max-w-prose border-t border-rule pt-3 text-table">
              <p className="m-0">
                <VerdictMark verdict={one.verdict} strong />{' '}
                <span className="text-muted">
                  on {one.instrument}, {formatHoursFromSeconds(one.trueSeconds)} with true overheads
                </span>
              </p>
              <p className="mt-1 mb-0">{one.reason}</p>
            </div>
          ))}
        </section>
      ) : null}
      <section className="mt-10">
        <SectionHeading
          title="Comments of the reviewers"
          aside="Unsigned, in no order that means anything."
        />
        {decision.comments.length === 0 ? <p className="mt-3 text-muted">None were written.</p> : null}
        {decision.comments.map((comment, index) => (
          <p
            key={index}
            className="mt-3 mb-0 max-w-prose border-t border-rule pt-3 [overflow-wrap:anywhere] whitespace-pre-line"
          >
            {comment}
          </p>
        ))}
      </section>
    </TwoColumns>
  )
}
