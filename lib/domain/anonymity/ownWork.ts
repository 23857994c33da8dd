const own = '(?:own|earlier|previous|recent|past|published|first|pilot)'
const works =
  '(?:papers?|work|results?|sample|survey|data|analysis|catalogue|catalog|observations?|proposals?|programmes?|programs?|group|team|collaboration|pipeline|code|institute|university|observatory)'

// Wordings by which authors claim a work as theirs; what is asked for now is `our sample` too, so that one is let be.
const turns: readonly RegExp[] = [
  new RegExp(String.raw`\b(?:our|my)\s+(?:${own}\s+)+${works}\b`, 'giu'),
  /\b(?:our|my)\s+(?:group|team|collaboration|institute|university|observatory|pipeline)\b/giu,
  /\b(?:we|I)\s+(?:have\s+)?(?:previously|already|recently|earlier)\s+(?:shown|showed|found|reported|published|observed|measured|demonstrated)\b/giu,
  /\b(?:as\s+)?(?:we|I)\s+(?:have\s+)?(?:shown|showed|published|reported|demonstrated|argued)\s+(?:in|that|earlier|before)\b/giu,
  /\bby\s+(?:us|our\s+team|our\s+group)\b/giu,
  /\bour\s+\S+\s+et\s+al\b/giu,
]

export interface Turn {
  words: string
  /** Where it begins, characters. */
  from: number
}

/** Turns of phrase by which authors give themselves away, each where it begins. */
export function ownWork(text: string): Turn[] {
  const found = turns.flatMap((turn) =>
    [...text.matchAll(turn)].map(({ 0: words, index }) => ({
      words: words.replace(/\s+/g, ' '),
      from: index,
    })),
  )
  const first = found.sort((a, b) => a.from - b.from || b.words.length - a.words.length)
  let end = -1
  return first.filter(({ words, from }) => {
    if (from < end) return false
    end = from + words.length
    return true
  })
}
