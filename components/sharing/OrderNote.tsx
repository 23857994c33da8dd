import { BarNote } from '@/components/ui/BarNote'
import { TextLink } from '@/components/ui/TextLink'
import type { OrderState } from '@/lib/domain/sharing/readOrderState'
import { formatList } from '@/lib/format'

const words = {
  rule: 'Time is kept for the other panels as the rule between panels gives it, whoever divides the nights first.',
  meeting:
    'Time is kept for the other panels as their meeting ordered the proposals, whoever divides the nights first.',
}

/** On the nights of a call with several panels: which order of all of them the suggestion follows. */
export function OrderNote({ state, href }: { state: OrderState; href: string }) {
  return (
    <div className="mb-6">
      <BarNote tone={state.follows === 'waits' ? 'lamp' : 'accent'}>
        {state.follows === 'waits'
          ? `${formatList(state.waitsFor)} ${state.waitsFor.length === 1 ? 'has' : 'have'} no frozen ranking yet. Until then no time is kept for other panels: what is given here is gone for them.`
          : words[state.follows]}{' '}
        <TextLink href={href}>Between panels</TextLink>
      </BarNote>
    </div>
  )
}
