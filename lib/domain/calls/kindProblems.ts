import type { z } from 'zod'
import type { CallsRow } from '@/db/tables'
import { countInWords, formatUtcWithYear } from '@/lib/format'
import type { saveKindSchema } from './rulesSchema'
import { brokenLimits, type SentSize } from './sentSize'
import type { CallKind, CallPanel } from './types'

type Wanted = Pick<
  z.output<typeof saveKindSchema>,
  | 'kind'
  | 'closesAt'
  | 'pageLimit'
  | 'wordLimit'
  | 'figureLimit'
  | 'targetLimit'
  | 'abstractLimit'
  | 'maxHours'
  | 'panelId'
  | 'takesAwaited'
>

interface Known {
  /** The kind as it stands; null for a new one. */
  was: CallKind | null
  kinds: readonly Pick<CallKind, 'id' | 'kind'>[]
  panels: readonly Pick<CallPanel, 'id'>[]
  sent: readonly SentSize[]
  /** Proposals of this kind, drafts with them, that name something awaited. */
  awaiting: number
  call: Pick<CallsRow, 'stage' | 'opens_at' | 'closes_at' | 'assessments_due_at'>
  now: Date
}

function deadlineProblem({ closesAt }: Wanted, { was, call, now }: Known): string | null {
  if (!closesAt) return null
  if (closesAt <= call.opens_at) return 'It must come after the opening of the call.'
  if (closesAt >= call.assessments_due_at)
    return `It must come before assessments are due, ${formatUtcWithYear(call.assessments_due_at)}.`
  const isMoved = was?.closesAt?.getTime() !== closesAt.getTime()
  return call.stage !== 'planned' && isMoved && closesAt <= now
    ? 'A deadline in the past would shut people out unannounced.'
    : null
}

function panelProblem(wanted: Wanted, { was, panels, sent }: Known): string | null {
  if (!panels.some(({ id }) => id === wanted.panelId)) return 'Choose a panel of this call.'
  const elsewhere = sent.filter(({ kindId, panelId }) => kindId === was?.id && panelId !== wanted.panelId)
  if (elsewhere.length === 0) return null
  const went = `${countInWords(elsewhere.length, 'proposal', 'proposals', true)} of this kind went to another panel`
  return `${went} when sent, and ${elsewhere.length === 1 ? 'stays' : 'stay'} there.`
}

/** What is awaited and stands in a proposal, begun or sent, cannot be forbidden afterwards. */
function awaitedProblem(wanted: Wanted, { awaiting }: Known): string | null {
  return wanted.takesAwaited || awaiting === 0
    ? null
    : `${countInWords(awaiting, 'proposal', 'proposals', true)} of this kind ${awaiting === 1 ? 'names a target' : 'name targets'} that ${awaiting === 1 ? 'is' : 'are'} awaited.`
}

/** What is wrong with a kind as it is wanted, by field; nothing where it can be. */
export function kindProblems(wanted: Wanted, known: Known): Record<string, string> {
  const { was, kinds, sent } = known
  const own = sent.filter(({ kindId }) => kindId === was?.id)
  const limits = { ...wanted, maxSeconds: wanted.maxHours === null ? null : wanted.maxHours * 3600 }
  const problems: Record<string, string | null> = {
    ...brokenLimits(limits, own),
    closesAt: deadlineProblem(wanted, known),
    panelId: panelProblem(wanted, known),
    takesAwaited: awaitedProblem(wanted, known),
    kind: kinds.some(({ id, kind }) => kind === wanted.kind && id !== was?.id)
      ? 'The call has this kind already.'
      : null,
  }
  return Object.fromEntries(
    Object.entries(problems).filter((entry): entry is [string, string] => entry[1] !== null),
  )
}
