/** What a proposal is about, broadly; reviewers are found by it. */
export const categories = [
  'First light and reionisation',
  'Galaxies beyond redshift 2',
  'Galaxies over the last ten billion years',
  'Nearby galaxies and their surroundings',
  'Active galaxies and black holes',
  'Groups, clusters and the web between them',
  'Gas within and between galaxies',
  'Gravitational lenses',
  'Supernovae and other passing events',
  'Distances and the expansion',
  'Surveys and maps',
] as const
