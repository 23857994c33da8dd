/** Rows of a CSV file by the names of its head: commas, doubled quotes and line ends as RFC 4180 has them. */
export function csvRows(text: string): Record<string, string>[] {
  const cells: string[][] = [[]]
  for (const [, quoted, plain = '', end] of text.matchAll(/(?:"((?:[^"]|"")*)"|([^",\r\n]*))(,|\r\n|$)/g)) {
    cells.at(-1)?.push(quoted === undefined ? plain : quoted.replaceAll('""', '"'))
    if (end !== ',') cells.push([])
  }
  const [head = [], ...rows] = cells.filter((row) => row.length > 1)
  return rows.map((row) => Object.fromEntries(head.map((name, at) => [name, row[at] ?? ''])))
}
