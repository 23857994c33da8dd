import { askWords } from '@/components/calls/askWords'
import type { OpenKind } from '@/lib/domain/proposals/readOpenKinds'
import { countInWords, formatHoursFromSeconds, formatMoneyShort, formatUtc } from '@/lib/format'

/** What a kind of proposal allows and asks, in a line under its name. */
export function kindWords({ call, kind, deadline }: OpenKind): string {
  const most = kind.maxSeconds === null ? '' : `at most ${formatHoursFromSeconds(kind.maxSeconds)}, `
  const fee =
    call.currency && kind.feeMinor > 0
      ? `, a fee of up to ${formatMoneyShort(kind.feeMinor, call.currency)}`
      : ''
  return `${most}${countInWords(kind.pageLimit, 'page')} of justification${askWords(kind)}${fee}, closes ${formatUtc(deadline)}`
}
