/** How a rule is named, and what it comes to. */
export const ruleNames = {
  hours: 'By hours asked',
  proposals: 'By number of proposals',
  fixed: 'Fixed shares',
} as const

export const ruleHelp = {
  hours: 'Each panel has the part of a telescope’s time that its proposals ask of all hours asked of it.',
  proposals: 'Each panel has the part that its proposals are of all proposals asking for the telescope.',
  fixed: 'Each panel has a percentage of every telescope’s time, whatever is asked. Written by the office.',
} as const
