export type SeriesTone = 's1' | 's2' | 's3' | 's4'

/** Series are told apart by dash as well as by colour. */
export const seriesDashes: Record<SeriesTone, string | undefined> = {
  s1: undefined,
  s2: '7 3',
  s3: '2 3',
  s4: '11 3 2 3',
}
