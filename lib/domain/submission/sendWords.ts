import { countInWords } from '@/lib/format'
import type { SectionReport } from '../proposals/completeness'

/** The declaration that goes with the button; nobody speaks for others who is alone. */
export function declarationFor(people: number): string {
  if (people <= 1) return 'I have read this version, and agree to it being sent.'
  const all = people === 2 ? 'Both of us' : `All ${countInWords(people, '', '').trim()} of us`
  return `${all} have read this version, and agree to it being sent.`
}

/** The sentence under the title: how far it is, or that it is in. */
export function leadFor(read: { isIn: boolean; sections: readonly SectionReport[] }): string {
  if (read.isIn) return 'This proposal has been sent. It is shown as it stands.'
  const others = read.sections.filter(({ section }) => section !== 'send')
  const whole = others.filter(({ missing }) => missing.length === 0).length
  if (whole === others.length)
    return `${countInWords(whole, 'section is', 'sections are', true)} done; this is the last. After an edit you come back here.`
  return `${countInWords(others.length - whole, 'section wants', 'sections want', true)} something yet. After an edit you come back here.`
}
