/** Below this, a reviewer has little to do with a subject: less than a stated level of one. */
export const LITTLE = 0.25

/** An affinity of 0 to 1 in words, at the places where the stated levels stand; null is somebody who has said nothing. */
export function affinityWords(affinity: number | null): string {
  if (affinity === null) return 'has not said'
  if (affinity >= 0.75) return 'main field'
  if (affinity >= 0.5) return 'works in it'
  return affinity >= LITTLE ? 'knows it' : 'another field'
}
