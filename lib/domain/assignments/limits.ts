/** The most readers that may be asked for each proposal. */
export const mostReaders = 14
