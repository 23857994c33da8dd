import { formatList } from '@/lib/format'
import type { Giveaway, Place, SourceName } from './types'

const whole: Readonly<Record<SourceName, string>> = {
  title: 'in the title',
  abstract: 'in the abstract',
  conditions: 'in the conditions',
  text: 'in the text',
  captions: 'in the captions',
  references: 'in the references',
  document: 'in the PDF',
  properties: 'in the properties of the PDF',
}

const counted: Readonly<Partial<Record<SourceName, readonly [one: string, many: string, of: string]>>> = {
  abstract: ['on line', 'on lines', ' of the abstract'],
  text: ['on line', 'on lines', ' of the text'],
  captions: ['under figure', 'under figures', ''],
  references: ['on line', 'on lines', ' of the references'],
  document: ['on page', 'on pages', ' of the PDF'],
}

function inSource(source: SourceName, places: readonly Place[]): string {
  const words = counted[source]
  const at = places.flatMap((place) => (place.at === null ? [] : [place.at]))
  if (!words || at.length === 0) return whole[source]
  const [one, many, of] = words
  return `${at.length === 1 ? one : many} ${formatList(at.map(String))}${of}`
}

/** `on lines 3 and 9 of the text, and in the title` */
export function placesWords({ places }: Pick<Giveaway, 'places'>): string {
  const sources = [...new Set(places.map(({ source }) => source))]
  return formatList(
    sources.map((source) =>
      inSource(
        source,
        places.filter((place) => place.source === source),
      ),
    ),
  )
}
