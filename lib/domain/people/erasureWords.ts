import { countInWords, formatList } from '@/lib/format'

export interface ErasureView {
  /** Sentences that say what must be done first; empty when the person can be erased. */
  inTheWay: string[]
  goes: string[]
  /** What stays, and why. */
  stays: { what: string; why: string }[]
}

/** What must be laid down first, a sentence each. */
export function wayWords(way: { leads: readonly string[]; reviews: number; roles: number }): string[] {
  return [
    way.leads.length > 0 &&
      `Leads ${formatList(way.leads)}, on which nobody has decided: another has to lead it, or it has to be withdrawn.`,
    way.reviews > 0 &&
      `Has ${countInWords(way.reviews, 'review', 'reviews')} in hand: the chair has to find somebody else.`,
    way.roles > 0 &&
      `Holds ${countInWords(way.roles, 'role')} besides the investigator’s: to be ended first.`,
  ].filter((sentence) => sentence !== false)
}

/** What is blanked, the same for everyone. */
export const whatGoes: readonly string[] = [
  'Name, address, institute, ORCID iD, career stage and password of the account',
  'Answers given freely, browsers signed in, and every link that was mailed',
  'The words of all letters to this person, and where they went',
  'The name on drafts; a draft this person leads is put away',
  'Private notes beside reviews',
]

/** What stays, with its numbers and the reason; what there is none of is left out. */
export function whatStays(kept: {
  sentProposals: number
  reviews: number
  assessments: number
  fees: number
  deeds: number
}): ErasureView['stays'] {
  const lines = [
    {
      n: kept.sentProposals,
      what: `The name on ${countInWords(kept.sentProposals, 'sent proposal')}, without the address`,
      why: 'A sent version stays as it was sent: time was asked for, and perhaps given, by these names.',
    },
    {
      n: kept.reviews,
      what: `${countInWords(kept.reviews, 'review', 'reviews', true)} with scores and comments, without a name`,
      why: 'Decisions on others’ proposals rest on them.',
    },
    {
      n: kept.assessments,
      what: `${countInWords(kept.assessments, 'assessment', 'assessments', true)}, without a name`,
      why: 'The time a proposal was given rests on them.',
    },
    {
      n: kept.fees,
      what: `${countInWords(kept.fees, 'fee', 'fees', true)} with payments, receipts and waivers`,
      why: 'The law wants accounts kept.',
    },
    {
      n: kept.deeds,
      what: `${countInWords(kept.deeds, 'row', 'rows', true)} of the logbook, without a name, with the address of the connection`,
      why: 'It proves what happened; to change one row would break its seal.',
    },
  ]
  return lines.filter(({ n }) => n > 0).map(({ what, why }) => ({ what, why }))
}
