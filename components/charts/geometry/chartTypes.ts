export type SeriesTone = 's1' | 's2' | 's3' | 's4' | 's5' | 's6'

/** Series are told apart by dash as well as by colour. */
export const seriesDashes: Record<SeriesTone, string | undefined> = {
  s1: undefined,
  s2: '7 3',
  s3: '2 3',
  s4: '11 3 2 3',
  s5: '16 4',
  s6: '4 3 1 3 1 3',
}

/** The tones in the order in which series get them. */
export const seriesTones = ['s1', 's2', 's3', 's4', 's5', 's6'] as const satisfies readonly SeriesTone[]
