/** Splits text into records of cells (RFC 4180): quoted cells, doubled quotes, any line end. */
export function readRecords(text: string, delimiter: string): string[][] {
  const records: string[][] = []
  let record: string[] = []
  let cell = ''
  let isQuoted = false
  const endCell = () => {
    record.push(cell)
    cell = ''
  }
  const endRecord = () => {
    endCell()
    if (record.some((one) => one.trim() !== '')) records.push(record)
    record = []
  }
  for (let i = 0; i < text.length; i += 1) {
    const c = text.charAt(i)
    if (isQuoted) {
      if (c !== '"') cell += c
      else if (text.charAt(i + 1) === '"') {
        cell += '"'
        i += 1
      } else isQuoted = false
    } else if (c === '"' && cell.trim() === '') {
      cell = ''
      isQuoted = true
    } else if (c === delimiter) endCell()
    else if (c === '\n') endRecord()
    else if (c !== '\r') cell += c
  }
  endRecord()
  return records
}

/** The delimiter a header line uses: the one of comma, semicolon and tab it has most of; blank where it has none. */
export function delimiterOf(line: string): ',' | ';' | '\t' | ' ' {
  const count = (c: string) => line.split(c).length - 1
  const [best = ','] = ([',', ';', '\t'] as const).toSorted((a, b) => count(b) - count(a))
  return count(best) > 0 ? best : ' '
}
