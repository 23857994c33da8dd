/** What a letter to many may name, in braces; filled for each who gets it. */
export const letterFields = {
  name: 'the name of whoever gets it',
  institute: 'their institute',
  call: 'the call, as “call 14”',
  deadline: 'its deadline',
  proposals: 'their proposals, reference and title',
} as const

export type LetterField = keyof typeof letterFields
export type FilledFields = Readonly<Record<LetterField, string>>

const braces = /\{([^{}\s]{1,40})\}/g
const isField = (name: string): name is LetterField => Object.hasOwn(letterFields, name)

/** Puts the values in place of the fields. A value is text and nothing else: it is never read as Markdown. */
export function fillFields(text: string, values: FilledFields): string {
  return text.replace(braces, (typed, name: string) => (isField(name) ? values[name] : typed))
}

/** Why the fields of a text cannot be filled for an audience; null when they can. */
export function problemOfFields(
  text: string,
  audience: { callId: string; parts: readonly string[] },
): string | null {
  const used = [...text.matchAll(braces)].map((match) => match[1] ?? '')
  const unknown = used.find((name) => !isField(name))
  if (unknown !== undefined)
    return `There is no field {${unknown}}. There are ${Object.keys(letterFields)
      .map((name) => `{${name}}`)
      .join(', ')}.`
  if ((used.includes('call') || used.includes('deadline')) && !audience.callId)
    return 'Choose a call: {call} and {deadline} are of one call.'
  if (used.includes('proposals') && audience.parts.some((part) => part !== 'lead' && part !== 'named'))
    return '{proposals} is only for those who lead proposals or are named on them.'
  return null
}
