/** An instant as the form keeps it (`2027-03-31T22:00:00Z`), taken apart for its two controls. */
export function splitUtc(text: string): { date: string; time: string } {
  const [date = '', rest = ''] = text.split('T')
  return { date, time: rest.replace(/Z$/, '').slice(0, 8) }
}

/** And put together again; half an instant stays half, so that the schema can say what is missing. */
export function joinUtc(date: string, time: string): string {
  if (!date && !time) return ''
  return `${date}T${time.length === 5 ? `${time}:00` : time}Z`
}

/** The instant a whole text stands for, or null. */
export function parseUtc(text: string): Date | null {
  if (!/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}:\d{2}(\.\d{1,3})?Z$/.test(text)) return null
  const at = new Date(text)
  return Number.isNaN(at.getTime()) || at.toISOString().slice(0, 10) !== text.slice(0, 10) ? null : at
}
