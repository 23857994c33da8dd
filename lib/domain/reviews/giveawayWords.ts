import { placesOf, type Place } from './placesOf'

// Turns of phrase by which reviewers give themselves away; a hint, never a refusal.
const tells: readonly RegExp[] = [
  /\bmy (?:own |recent |earlier |previous )?(?:papers?|work|group|team|results?|sample|data|students?|proposals?)\b/giu,
  /\bour (?:own |recent |earlier |previous )?(?:papers?|group|team|results?|sample|survey|proposals?)\b/giu,
  /\b(?:I|we) (?:published|showed|reported|found) (?:in|that|this)\b/giu,
  /\bas (?:I|we) (?:have )?(?:shown|showed|argued|published)\b/giu,
  /\bat my (?:institute|university|observatory|department)\b/giu,
]

/** Where a text may tell the investigators who wrote it. */
export const giveawayPlaces = (text: string): Place[] => placesOf(text, tells)

/** Words in a text that may tell the investigators who wrote it, as they stand there; of each turn of phrase the first. */
export function givesAway(text: string): string[] {
  return tells.flatMap((tell) =>
    placesOf(text, [tell])
      .slice(0, 1)
      .map((place) => place.words),
  )
}
