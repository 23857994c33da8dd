/** The print theme: white paper, the day's inks. Sizes are in points; the page was drawn 794 px wide. */
export const colour = {
  ink: '#171C2B',
  muted: '#565D70',
  rule: '#DDD7C8',
  grid: '#E9E4D8',
  edge: '#857F70',
  accent: '#3B2F6B',
  lamp: '#A85508',
  feasible: '#1C6A57',
  marginal: '#8A5200',
  'not-feasible': '#A1212E',
} as const

/** Points of one pixel of the drawing. */
const px = 0.75

export const size = {
  margin: 56 * px,
  title: 25 * px,
  section: 15 * px,
  text: 12.5 * px,
  textLeading: 1.52,
  table: 11 * px,
  unit: 9.5 * px,
  footer: 10.5 * px,
  /** Room kept at the foot of each page for the footer, which is laid over it at the end. */
  foot: 78 * px,
} as const
