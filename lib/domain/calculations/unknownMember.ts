/** What is said of members that a request does not have; the first stands for all. */
export const unknownMember = ([first = '']: readonly string[]): string =>
  `Nothing here is called “${first.slice(0, 40)}”.`
