type Level = 1 | 2 | 3

/** What the panel of the demonstration says it knows; one member has not said. */
export const expertise: Readonly<
  Record<string, { levels: Readonly<Record<string, Level>>; words: readonly string[] }>
> = {
  'Edda Vorskell': {
    levels: { 'Active galaxies and black holes': 3, 'Gas within and between galaxies': 1 },
    words: ['reverberation', 'broad lines', 'outflow', 'black hole'],
  },
  'Joren Blackmarsh': {
    levels: { 'Groups, clusters and the web between them': 3, 'Gravitational lenses': 2 },
    words: ['cluster', 'weak lensing', 'brightest cluster galaxies'],
  },
  'Ayla Stroud': {
    levels: { 'Galaxies beyond redshift 2': 3, 'First light and reionisation': 2 },
    words: ['Lyman alpha', 'line width', 'star formation'],
  },
  'Corin Thessaly': {
    levels: { 'Distances and the expansion': 3, 'Supernovae and other passing events': 2 },
    words: ['supernova', 'distance', 'peculiar velocity', 'standard candle'],
  },
  'Mirela Fontane': {
    levels: { 'Gas within and between galaxies': 3, 'Galaxies beyond redshift 2': 2 },
    words: ['absorption', 'metals', 'halo', 'outflow'],
  },
  'Delphine Ostrake': {
    levels: {
      'Galaxies over the last ten billion years': 3,
      'Nearby galaxies and their surroundings': 2,
      'Galaxies beyond redshift 2': 1,
    },
    words: ['stellar mass', 'star formation', 'quenching', 'rotation'],
  },
  'Rasmus Ekholt': {
    levels: { 'Surveys and maps': 3, 'Distances and the expansion': 1 },
    words: ['photometric redshift', 'survey', 'field', 'counts'],
  },
  'Ines Caldwyn': {
    levels: { 'Gravitational lenses': 3, 'Distances and the expansion': 2 },
    words: ['lens', 'time delay', 'arc', 'quasar'],
  },
  'Tobin Aldersey': {
    levels: { 'Nearby galaxies and their surroundings': 3, 'Galaxies over the last ten billion years': 2 },
    words: ['dwarf', 'satellite', 'surface brightness', 'metallicity'],
  },
  'Yuna Parrish': {
    levels: { 'Supernovae and other passing events': 3, 'Active galaxies and black holes': 1 },
    words: ['supernova', 'light curve', 'host galaxies', 'spectra'],
  },
  'Hedda Brandvik': {
    levels: { 'First light and reionisation': 3, 'Galaxies beyond redshift 2': 2, 'Surveys and maps': 1 },
    words: ['reionisation', 'Lyman alpha', 'dropout', 'high redshift'],
  },
  'Oskar Delmain': {
    levels: { 'Active galaxies and black holes': 2, 'Gas within and between galaxies': 2 },
    words: ['quasar', 'absorption', 'broad lines', 'variability'],
  },
  'Priya Valmont': {
    levels: { 'Groups, clusters and the web between them': 2, 'Galaxies over the last ten billion years': 2 },
    words: ['group', 'environment', 'quenching', 'velocity dispersion'],
  },
}
