import type { Writings } from './writingTypes'

const none = { text: '', version: 0 } as const

/** Texts nobody has begun: of proposals from before texts were written here, and for pages that need none. */
export const unwritten: Writings = { justification: none, references: none, team: none }
