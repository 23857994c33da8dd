/** The most bytes of a form with a file: above every limit of a file, so that the verb can say which was passed. */
export const maxFormBytes = 25_000_000
