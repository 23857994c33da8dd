/**
 * A text as words one space apart, with a space at either end, so that a phrase is found as a part of it: case, accents,
 * punctuation and a plural's ending do not count.
 */
export function wordsOfText(text: string): string {
  const words = text
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .split(/[^\p{L}\p{N}]+/u)
    .filter(Boolean)
    .map((word) => {
      if (word.length > 4 && word.endsWith('ies')) return `${word.slice(0, -3)}y`
      return word.length > 3 && /[^su]s$/.test(word) ? word.slice(0, -1) : word
    })
  return ` ${words.join(' ')} `
}
