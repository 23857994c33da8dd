import type { Letter } from '../letter'

const aboutFee = {
  none: null,
  kept: 'The deadline had passed, so its fee stands as it was.',
  cancelled: 'Nothing is owed for it.',
  refunded: 'What was paid goes back in full to the card it came from.',
} as const

/** To every investigator: it has left the call, by whom, and what becomes of the fee. */
export function proposalWithdrawn(facts: {
  name: string
  title: string
  reference: string
  by: string
  fee: keyof typeof aboutFee
  url: string
}): Letter {
  const fee = aboutFee[facts.fee]
  return {
    template: 'proposal-withdrawn',
    subject: `${facts.reference} has been withdrawn`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [
      `${facts.by} has withdrawn “${facts.title}”. It is out of the call, and nobody will decide on it.`,
      ...(fee ? [fee] : []),
    ],
    action: { label: 'See the proposal', url: facts.url },
  }
}
