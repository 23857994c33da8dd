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
      `Has ${countInWords(way.reviews, 'review', 'reviews')} in hand: the chair has to give them to others.`,
    way.roles > 0 &&
      `Holds ${countInWords(way.roles, 'role', 'roles')} besides the investigator’s: end them first.`,
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

/** What stays, with its numbers and the reason. */
export function whatStays(kept: {
  sentProposals: number
  reviews: number
  assessments: number
  fees: number
  deeds: number
}): ErasureView['stays'] {
  return [
    {
      what: `The name on ${countInWords(kept.sentProposals, 'sent proposal', 'sent proposals')}, without the address`,
      why: 'A sent version stays as it was sent: time was asked for, and perhaps given, by these names.',
    },
    {
      what: `${countInWords(kept.reviews, 'review', 'reviews')} with scores and comments, without a name`,
      why: 'Decisions on others’ proposals rest on them.',
    },
    {
      what: `${countInWords(kept.assessments, 'assessment', 'assessments')}, without a name`,
      why: 'The time a proposal was given rests on them.',
    },
    {
      what: `${countInWords(kept.fees, 'fee', 'fees')} with payments, receipts and waivers`,
      why: 'The law wants accounts kept.',
    },
    {
      what: `${countInWords(kept.deeds, 'row', 'rows')} of the logbook, without a name, with the address of the connection`,
      why: 'It proves what happened; to change one row would break its seal.',
    },
  ]
}
