import { clampScore, scoreRuler } from './scoreRuler'

/**
 * The score after a key, or undefined when the key means nothing here.
 * Digits set the whole points (a 0 after a 1 makes 10), a point adds a half, Delete takes the score away.
 */
export function scoreKey(key: string, score: number | null): number | null | undefined {
  const stepped = (by: number) => (score === null ? (by > 0 ? 0 : scoreRuler.max) : clampScore(score + by))
  switch (key) {
    case 'ArrowRight':
    case 'ArrowUp':
      return stepped(scoreRuler.step)
    case 'ArrowLeft':
    case 'ArrowDown':
      return stepped(-scoreRuler.step)
    case 'PageUp':
      return stepped(1)
    case 'PageDown':
      return stepped(-1)
    case 'Home':
      return 0
    case 'End':
      return scoreRuler.max
    case 'Delete':
    case 'Backspace':
      return null
    case '.':
    case ',':
      return score === null ? undefined : clampScore(Math.floor(score) + scoreRuler.step)
    default:
      if (!/^\d$/.test(key)) return undefined
      return key === '0' && score === 1 ? scoreRuler.max : Number(key)
  }
}
