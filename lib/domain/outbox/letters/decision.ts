import { formatHoursFromSeconds } from '@/lib/format'
import type { Letter } from '../letter'

export interface DecisionNews {
  callNumber: number
  reference: string
  title: string
  outcome: 'awarded' | 'reserve' | 'declined'
  lines: readonly {
    instrument: string
    seconds: number
    isReserve: boolean
    conditions: string
    evenings?: string
  }[]
}

const sentence = {
  awarded: 'The panel has awarded time to your proposal.',
  reserve:
    'The panel holds your proposal in reserve: it is observed when time falls free, and you hear at once if so.',
  declined: 'The panel could not give time to your proposal.',
} as const

/** To every investigator, once, when the decisions are made known. */
export function decisionLetter(to: { name: string }, news: DecisionNews, url: string): Letter {
  return {
    template: 'decision',
    subject: `${news.reference}: ${news.outcome}, call ${news.callNumber}`,
    greeting: `Dear ${to.name},`,
    paragraphs: [
      `${news.title} (${news.reference})`,
      sentence[news.outcome],
      'The statement of the panel and the comments of its reviewers stand on the page of the outcome.',
    ],
    facts: news.lines.map(
      (line) =>
        [
          line.instrument,
          [
            formatHoursFromSeconds(line.seconds),
            line.isReserve ? 'in reserve' : '',
            line.evenings ? `visitor, ${line.evenings}` : '',
            line.conditions,
          ]
            .filter(Boolean)
            .join(', '),
        ] as const,
    ),
    action: { label: 'Read the outcome', url },
  }
}
