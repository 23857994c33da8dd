/** What the form of a group works with in the browser: the pure part of this noun. */
export { groupAnchor } from './groupAnchor'
export { groupRow } from './groupRow'
export { groupSchema, type GroupRow } from './schema'
export { unknownGroups } from './unknownGroups'
