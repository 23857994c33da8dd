/** What a part of a night is for: science in the call, engineering, or time promised to others before. */
export const nightUses = ['science', 'engineering', 'promised'] as const
export type NightUse = (typeof nightUses)[number]
