import { sayTime } from './measure'

/** Prints a row that is no time of ours against one of theirs. */
export function reportText(name: string, ours: string, theirs = ''): void {
  process.stdout.write(`${JSON.stringify({ name, ours, theirs, ratio: '' })}\n`)
}

/** Prints one row for the table: our time and, in the same run, that of an independent library. */
export function report(name: string, ours: number, theirs: number | undefined): void {
  const row = {
    name,
    ours: sayTime(ours),
    theirs: theirs === undefined ? 'skipped: python3-astropy is not installed' : sayTime(theirs),
    ratio: theirs === undefined ? '' : String(Number((theirs / ours).toPrecision(2))),
  }
  process.stdout.write(`${JSON.stringify(row)}\n`)
}
