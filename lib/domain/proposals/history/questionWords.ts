import { formatNumber } from '@/lib/format'
import { textAt, type EntryValues } from './entryValues'

const length = (text: string) => formatNumber([...text].length)

/** What changed in title, abstract and category. */
export function questionWords({ before, after }: EntryValues): string {
  const title = textAt(after, 'title')
  const abstract = textAt(after, 'abstract')
  const category = textAt(after, 'category')
  const parts = [
    title === null ? '' : `Title: “${title}”`,
    abstract === null
      ? ''
      : `Abstract: ${length(textAt(before, 'abstract') ?? '')} to ${length(abstract)} characters`,
    category === null ? '' : `Category: ${category || 'none'}`,
  ].filter(Boolean)
  return parts.join('; ')
}
