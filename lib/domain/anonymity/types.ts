export type SourceName =
  'title' | 'abstract' | 'conditions' | 'text' | 'captions' | 'references' | 'document' | 'properties'

/** A text that reviewers read, in its parts: lines, pages, captions. `at` counts them from 1; null where there is one. */
export interface Source {
  name: SourceName
  parts: { at: number | null; text: string }[]
}

export interface Place {
  source: SourceName
  /** Line of a text, page of a document, number of a figure. */
  at: number | null
}

/** Something by which the investigators could be recognised. */
export interface Giveaway {
  kind: 'name' | 'institute' | 'address' | 'orcid' | 'phrase'
  /** As the people page has it, or as it stands in the text. */
  what: string
  places: Place[]
}
