/** U+2212, the minus that is as wide as a figure. */
export const TRUE_MINUS = '\u2212'
/** Keeps a number and its unit on one line. */
export const NO_BREAK_SPACE = '\u00a0'
/** What a table shows where there is no value. */
export const ABSENT = '\u2013'
