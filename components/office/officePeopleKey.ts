/** Names the data of the people tables, so that whatever changes them can have them read anew. */
export const officePeopleKey = ['office-people'] as const
