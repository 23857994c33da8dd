import type { DeclaredKind } from '@/lib/domain/conflicts/types'

/** Kinds of interest in the reviewer's words. */
export const interestKinds: readonly { value: DeclaredKind; label: string }[] = [
  { value: 'collaborator', label: 'We work together, or did in the last three years' },
  { value: 'institute', label: 'We are at the same institute' },
  { value: 'family', label: 'Family, or close friends' },
  { value: 'rival', label: 'We compete for the same answer' },
  { value: 'other', label: 'Another interest' },
]
