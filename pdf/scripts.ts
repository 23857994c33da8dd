import { canPrint } from './fonts'

export interface Run {
  text: string
  /** Raised or lowered, smaller. */
  shift: 'super' | 'sub' | null
}

const raised: Readonly<Record<string, string>> = {
  '⁰': '0',
  '¹': '1',
  '²': '2',
  '³': '3',
  '⁴': '4',
  '⁵': '5',
  '⁶': '6',
  '⁷': '7',
  '⁸': '8',
  '⁹': '9',
  '⁺': '+',
  '⁻': '−',
  ⁿ: 'n',
  ⁱ: 'i',
}
const lowered: Readonly<Record<string, string>> = {
  '₀': '0',
  '₁': '1',
  '₂': '2',
  '₃': '3',
  '₄': '4',
  '₅': '5',
  '₆': '6',
  '₇': '7',
  '₈': '8',
  '₉': '9',
  '₊': '+',
  '₋': '−',
  ₐ: 'a',
  ₑ: 'e',
  ₘ: 'm',
  ₙ: 'n',
  ₓ: 'x',
  ₕ: 'h',
  ₖ: 'k',
  ₗ: 'l',
  ₚ: 'p',
  ₛ: 's',
  ₜ: 't',
}
/** Printed for a character that no font has. */
const unknown = '□'

const isControl = (code: number) =>
  code < 32 || (code >= 0x7f && code < 0xa0) || (code >= 0x200b && code <= 0x200f)

/** Text in runs that can be printed: Unicode's small figures become set ones, since no font here has them all. */
export function runsOf(text: string): Run[] {
  const runs: Run[] = []
  const add = (character: string, shift: Run['shift']) => {
    const last = runs.at(-1)
    if (last && last.shift === shift) last.text += character
    else runs.push({ text: character, shift })
  }
  for (const character of text.normalize('NFC')) {
    const code = character.codePointAt(0) ?? 0
    const up = raised[character]
    const down = lowered[character]
    if (up) add(up, 'super')
    else if (down) add(down, 'sub')
    else if (character === '\n') add(character, null)
    else if (!isControl(code)) add(canPrint(code) ? character : unknown, null)
  }
  return runs
}
