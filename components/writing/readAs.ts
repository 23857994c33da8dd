/** What a text points to: numbers of its references by key, and of its figures by label. */
export interface ReadAs {
  citations: ReadonlyMap<string, number>
  figures: ReadonlyMap<string, number>
}
