/** What kinds of proposal there are; each at most once in a call. */
export const kindKeys = ['regular', 'large', 'thesis', 'monitoring', 'opportunity', 'discretion'] as const
