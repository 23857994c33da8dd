import type { CallKind } from '@/lib/domain/calls/types'
import { countInWords, formatList } from '@/lib/format'

/** What a kind of proposal limits and asks besides its lengths, each with the comma before it; empty for nothing. */
export function askWords(
  kind: Pick<CallKind, 'targetLimit' | 'takesAwaited' | 'needsCadence' | 'needsLastNight' | 'needsStudent'>,
): string {
  const says = [kind.needsCadence ? 'how often' : '', kind.needsLastNight ? 'by when' : ''].filter(Boolean)
  return [
    kind.targetLimit === null ? '' : `, at most ${countInWords(kind.targetLimit, 'target')}`,
    kind.takesAwaited ? ', also of what is awaited' : '',
    says.length > 0 ? `, saying ${formatList(says)}` : '',
    kind.needsStudent ? ', naming a student and a supervisor' : '',
  ].join('')
}
