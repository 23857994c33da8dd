export { parseDeclination } from './parseDeclination'
export { parseRightAscension } from './parseRightAscension'
export type { ParsedAngle } from './sexagesimal'
