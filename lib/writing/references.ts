/** One entry of a list of references, its TeX read into plain text. */
export interface Reference {
  key: string
  /** First line of the entry, from 1. */
  line: number
  /** Family names with initials: `Marrowby I.`. */
  authors: string[]
  year: string
  title: string
  /** Journal, book or archive, with volume and first page. */
  where: string
  doi: string
}

/** What is wrong in a list, and where. */
export interface ReferenceProblem {
  line: number
  sentence: string
}

export interface ReferenceList {
  references: Reference[]
  problems: ReferenceProblem[]
}
