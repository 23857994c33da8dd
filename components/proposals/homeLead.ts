import type { ReadProposal } from '@/lib/domain/proposals/readProposal'
import { isOpenForWriting } from '@/lib/domain/proposals/policy'
import { countInWords, formatUtc } from '@/lib/format'

/** The sentence under the title of a proposal's home: how far it is, and until when. */
export function homeLead({ contents, sections, readOnly, deadline }: ReadProposal): string {
  if (contents.state === 'withdrawn') return 'This proposal has been put away. It stays on record.'
  if (!isOpenForWriting(contents))
    return 'Sent. What was sent stands as it was, with every number computed then.'
  if (readOnly) return readOnly
  const own = sections.filter(({ section }) => section !== 'send')
  const done = own.filter(({ state }) => state === 'done').length
  const whole = countInWords(own.length, 'section')
  const count =
    done === 0
      ? `None of ${whole} is done yet`
      : `${countInWords(done, `of ${whole} is`, `of ${whole} are`, true)} done`
  const hour = formatUtc(deadline)
  return contents.isReopened
    ? `Reopened: what was sent stands until you send it again, by ${hour}. ${count}.`
    : `Everything saves as you type. ${count}; once nothing needs you, you can send, and you may reopen what you sent until ${hour}.`
}
