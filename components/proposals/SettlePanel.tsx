import { BarNote } from '@/components/ui/BarNote'
import { LinkButton } from '@/components/ui/LinkButton'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { TextLink } from '@/components/ui/TextLink'
import { VerdictMark } from '@/components/ui/VerdictMark'
import { isOpenForWriting } from '@/lib/domain/proposals/policy'
import type { ReadProposal } from '@/lib/domain/proposals/readProposal'
import { countInWords } from '@/lib/format'
import { paths } from '@/lib/paths'
import { sectionNames } from './sectionNames'
import { thingToSettle, type ThingToSettle } from './thingToSettle'

const verdictWords = { 'not-feasible': 'Not feasible', marginal: 'Marginal' } as const

function CheckNote({
  thing,
  reference,
}: {
  thing: Extract<ThingToSettle, { kind: 'check' }>
  reference: string
}) {
  const { check, verdict, target, observationId } = thing
  const working = `${paths.proposalSection(reference, 'feasibility')}#observation-${observationId}`
  return (
    <BarNote tone={verdict}>
      <VerdictMark verdict={verdict} words={`${verdictWords[verdict]}: ${target}`} />
      <p className="mt-1">{check.why}</p>
      {check.fix ? (
        <p className="mt-1">
          <strong className="font-semibold">What would fix it:</strong> {check.fix}
        </p>
      ) : null}
      <p className="mt-3 flex flex-wrap items-center gap-4">
        <LinkButton
          look="secondary"
          size="small"
          href={`${paths.proposalSection(reference, 'observing')}#observation-${observationId}`}
        >
          Change the observation
        </LinkButton>
        <TextLink href={working}>See the working</TextLink>
      </p>
    </BarNote>
  )
}

/** What stands where nothing is to settle; it never says more than is so. */
function restfulWords({ contents, computation }: ReadProposal): string {
  if (!isOpenForWriting(contents)) return 'Nothing is asked of you at the moment.'
  return computation.checksClear === computation.checksTotal
    ? 'Every check is clear. Read it through, then send it.'
    : 'What the checks say against it you have answered. Read it through, then send it.'
}

/** The one thing worth doing next, at the side of a proposal's home. */
export function SettlePanel({ read }: { read: ReadProposal }) {
  const { reference } = read.contents
  const thing = thingToSettle(read)
  return (
    <section>
      <SectionHeading dense title={thing.kind === 'nothing' ? 'Nothing to settle' : 'One thing to settle'} />
      <div className="mt-3">
        {thing.kind === 'check' ? <CheckNote thing={thing} reference={reference} /> : null}
        {thing.kind === 'missing' ? (
          <BarNote tone="lamp">
            <p className="m-0">{thing.missing.sentence}</p>
            <p className="mt-3 flex flex-wrap items-center gap-4">
              <LinkButton look="secondary" size="small" href={thing.missing.href}>
                Go to {sectionNames[thing.missing.section]}
              </LinkButton>
              {thing.others > 0 ? (
                <span className="text-muted">and {countInWords(thing.others, 'more thing')}</span>
              ) : null}
            </p>
          </BarNote>
        ) : null}
        {thing.kind === 'nothing' ? <p className="m-0 text-table text-muted">{restfulWords(read)}</p> : null}
      </div>
    </section>
  )
}
