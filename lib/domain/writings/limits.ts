import type { CallKind } from '../calls/types'

/** The longest text taken, characters: far above any limit of words, so that nothing typed is turned away. */
export const maxTextCharacters = 100_000
/** Words on the team, which have no limit of their own in the call. */
export const maxTeamWords = 600
/** Figures of one justification. */
export const maxFigures = 12
/** The largest picture taken, bytes: 10 MB. */
export const maxFigureBytes = 10_000_000

/** Figures a kind of proposal allows: its own limit, within the most there can be. */
export const figuresAllowed = (kind: Pick<CallKind, 'figureLimit'>): number =>
  Math.min(maxFigures, kind.figureLimit ?? maxFigures)
