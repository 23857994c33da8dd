// Categories of characters nobody types: controls, and marks that turn the direction of writing.
const hidden = /[\p{Cc}\u202a-\u202e\u2066-\u2069]/gu

/** Text of one line or many, composed (NFC), line ends alike, without characters that hide what it says. */
export function cleanText(text: string): string {
  return text
    .normalize('NFC')
    .replace(/\r\n?/g, '\n')
    .replace(hidden, (character) => (character === '\n' || character === '\t' ? character : ''))
}
