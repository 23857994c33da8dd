import type { LetterCase } from '@/db/queries/letterCases'
import type { Letter } from '../letter'

export interface SampleFacts {
  /** A proposal as it stands. */
  of: LetterCase
  /** Who looks: stands for the office. */
  clerk: string
  /** Where the product is reached. */
  origin: string
}

/** A letter of the product, to be tried on a real proposal. */
export interface LetterSample {
  template: string
  /** The name the letter itself has, where another letter has the same. */
  sentAs?: string
  /** When it is sent, and to whom. */
  title: string
  /** Null where the proposal has nothing this letter could tell. */
  build: (facts: SampleFacts) => Letter | null
}
