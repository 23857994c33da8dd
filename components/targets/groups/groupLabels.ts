/** What each field of a group is called. */
export const groupLabels = {
  name: 'Name',
  rule: 'What is wanted of it',
  atLeast: 'How many must be done',
  hoursFor: 'Hours are asked for',
  targetIds: 'Targets in it',
}
