import { formatUtcWithYear } from '@/lib/format'
import { parseText } from '@/lib/writing/parseText'
import type { Letter } from '../outbox/letter'
import { fillFields, type FilledFields } from './fields'
import { fillTree } from './fillTree'

export interface LetterCall {
  number: number
  closesAt: Date
}

interface Reader {
  name: string
  institute: string
  proposals: readonly { reference: string; title: string }[]
}

function valuesFor(reader: Reader, call: LetterCall | null): FilledFields {
  return {
    name: reader.name,
    institute: reader.institute || 'your institute',
    call: call ? `call ${call.number}` : '',
    deadline: call ? formatUtcWithYear(call.closesAt) : '',
    proposals: reader.proposals
      .map(({ reference, title }) => (title ? `${reference} “${title}”` : reference))
      .join(', '),
  }
}

/** The letter to one of many, with its fields filled. */
export function composeLetter(
  letter: { subject: string; text: string },
  reader: Reader,
  call: LetterCall | null,
): Letter {
  const values = valuesFor(reader, call)
  return {
    template: 'to-many',
    subject: fillFields(letter.subject, values).slice(0, 240),
    greeting: `Dear ${reader.name},`,
    paragraphs: [],
    blocks: fillTree(parseText(letter.text), values),
  }
}
