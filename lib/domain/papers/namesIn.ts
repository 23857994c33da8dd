import { fold } from '../conflicts/fold'
import type { Investigator } from '../proposals/types'
import type { PdfText } from './pdfText'

export interface NameFound {
  /** What was looked for, as the people page has it. */
  name: string
  /** Pages it stands on, from 1; empty when only the properties have it. */
  pages: number[]
  inProperties: boolean
}

/** A name's last word, when it is long enough not to be an everyday word. */
function surname(name: string): string | null {
  const last = fold(name).split(' ').at(-1) ?? ''
  return last.length >= 4 ? last : null
}

const holds = (text: string, words: string) => words !== '' && ` ${text} `.includes(` ${words} `)

/** Names, addresses and institutes of the investigators that can be read in a document meant to be anonymous. */
export function namesIn(
  text: PdfText,
  people: readonly Pick<Investigator, 'name' | 'email' | 'institute'>[],
): NameFound[] {
  const pages = text.pages.map(fold)
  const properties = fold(text.properties.join(' \n '))
  const wanted = new Map<string, string>()
  for (const { name, email, institute } of people) {
    wanted.set(name, surname(name) ?? fold(name))
    wanted.set(email, fold(email))
    if (fold(institute).length >= 6) wanted.set(institute, fold(institute))
  }
  return [...wanted].flatMap(([name, words]) => {
    const on = pages.flatMap((page, index) => (holds(page, words) ? [index + 1] : []))
    const inProperties = holds(properties, words)
    return on.length > 0 || inProperties ? [{ name, pages: on, inProperties }] : []
  })
}
