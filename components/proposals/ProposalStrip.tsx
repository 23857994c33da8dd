import { RequestStrip } from '@/components/layout/RequestStrip'
import type { StripCellProps } from '@/components/layout/StripCell'
import { Countdown } from '@/components/ui/Countdown'
import { TextLink } from '@/components/ui/TextLink'
import { VerdictMark } from '@/components/ui/VerdictMark'
import { isOpenForWriting } from '@/lib/domain/proposals/policy'
import type { ReadProposal } from '@/lib/domain/proposals/readProposal'
import { ABSENT, formatHoursFromSeconds, formatNights, formatUtcMinute } from '@/lib/format'
import { paths } from '@/lib/paths'
import { feeWords } from './feeWords'
import { stateWords } from './stateWords'
import { StripSaved } from './StripSaved'

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)

function timeCell({ contents, deadline, now }: ReadProposal): StripCellProps[] {
  if (!isOpenForWriting(contents)) return []
  const left = { untilMs: deadline.getTime(), serverNowMs: now.getTime(), passed: 'closed' }
  return [
    {
      label: 'Time left',
      tone: 'lamp',
      value: (
        <>
          <span className="max-sm:hidden">
            <Countdown {...left} />
          </span>
          <span className="sm:hidden">
            <Countdown {...left} parts={2} />
          </span>
        </>
      ),
    },
  ]
}

/** What the request comes to, from the proposal as it stands. */
export function ProposalStrip({ read }: { read: ReadProposal }) {
  const { contents, computation } = read
  const { reference } = contents
  const { verdict, checksClear, checksTotal } = computation
  const fee = feeWords(read)
  const cells: StripCellProps[] = [
    { label: capital(stateWords(contents)), value: reference, wideOnly: true },
    {
      label: 'Asked',
      value: formatHoursFromSeconds(computation.askedSeconds),
      trailing: formatNights(computation.askedNights),
    },
    {
      label: 'Needed',
      value: computation.neededSeconds > 0 ? formatHoursFromSeconds(computation.neededSeconds) : ABSENT,
    },
    {
      label: 'Verdict',
      value: verdict ? <VerdictMark verdict={verdict} /> : ABSENT,
      trailing: checksTotal > 0 ? `${checksClear} of ${checksTotal} checks clear` : undefined,
    },
    ...(fee
      ? [
          {
            label: 'Fee',
            value: (
              <>
                {fee.amount} <span className="font-normal text-muted max-strip:hidden">{fee.standing}</span>
              </>
            ),
          },
        ]
      : []),
    ...timeCell(read),
    { label: 'Changed', value: formatUtcMinute(contents.updatedAt), phoneOnly: true },
  ]
  return (
    <RequestStrip
      cells={cells}
      saved={<StripSaved savedAt={contents.updatedAt.toISOString()} />}
      history={<TextLink href={paths.proposalHistory(reference)}>History</TextLink>}
    />
  )
}
