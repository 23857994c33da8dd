import type { CallPhase } from '../calls/types'

/** With fewer others, a sum would tell how one of them scored. */
const FEWEST_OTHERS = 4

/**
 * Why a reviewer sees the own use of the scale alone, in a sentence; null when the others' may stand beside it. Scores are
 * independent until the panel has decided: nobody is to move towards the others.
 * @param others reviewers with a finished review; null while that is not counted
 */
export function whyScaleAlone(phase: CallPhase, others: number | null): string | null {
  if (phase !== 'decided' && phase !== 'archived')
    return 'How the others score is shown once the decisions are known.'
  return others !== null && others < FEWEST_OTHERS
    ? 'Too few others have scored for their scores to be shown together.'
    : null
}
