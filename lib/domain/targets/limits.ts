/** The most targets one proposal holds. */
export const mostTargets = 500
