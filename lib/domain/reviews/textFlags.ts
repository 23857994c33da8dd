import { giveawayPlaces } from './giveawayWords'
import { namePlaces, type KnownNames } from './namePlaces'
import { placesOf, type Place } from './placesOf'

export type FlagKind = 'gives-away' | 'names' | 'tone' | 'person' | 'scores' | 'contradicts'

export interface TextFlag extends Place {
  kind: FlagKind
}

// Judges the people, or judges without saying why. Words for flawed work ('weak', 'unclear') are not among them.
const harsh: readonly RegExp[] = [
  /\b(?:absurd|amateurish|appalling|clueless|hopeless|incompetent|laughable|ludicrous|nonsens(?:e|ical)|pathetic|ridiculous|rubbish|silly|stupid|worthless)\b/giu,
  /\b(?:lazy|sloppy|naive|naïve|careless|ignorant)\b/giu,
  /\bwaste of (?:telescope |our |everyone['’]s |precious )?time\b/giu,
  /\b(?:should|ought to) be ashamed\b/giu,
  /\b(?:obviously|clearly) (?:do(?:es)? not|don['’]t|doesn['’]t) (?:understand|know)\b/giu,
  /!{2,}|\?{2,}|\b\p{Lu}{3,} \p{Lu}{3,} \p{Lu}{3,}\b/gu,
]

// The packet names nobody, so nobody's sex, age or standing can be known from it.
const persons: readonly RegExp[] = [
  /\b(?:he|she|himself|herself|his|hers)\b/giu,
  /\b(?:young|junior|senior|experienced|inexperienced|well-known|famous|unknown) (?:PI|investigators?|team|group|authors?)\b/giu,
]

// Scores, ranks and seats are the panel's own.
const inner: readonly RegExp[] = [
  /\breviewers? \d{1,2}\b/giu,
  /\b(?:ranked?|rank of|place) (?:no\. ?|number )?\d{1,3}\b/giu,
  /\b(?:scored?|score of|mean of|rated|gave it|graded)(?: an?| it)? \d{1,2}(?:[.,]\d{1,2})?\b/giu,
  /\b\d{1,2}(?:[.,]\d)? ?(?:\/|out of) ?10\b/giu,
]

const praise: readonly RegExp[] = [
  /(?<!\bnot |\bless |\bhardly |\bneither )\b(?:excellent|outstanding|superb|compelling|exceptional|exemplary|first-rate|flawless|convincing)\b/giu,
]
const blame: readonly RegExp[] = [
  /(?<!\bnot |\bno |\bwithout )\b(?:unconvincing|not convincing|fatal(?:ly)?|flawed|not justified|unjustified|not feasible|poorly|superficial|unfocused|cannot work|does not work)\b/giu,
]

/** A score from here up is high, one up to `low` is low, of ten. */
const high = 7.5
const low = 4

/** Words of blame beside a high score, of praise beside a low one, where the other kind does not stand beside them. */
function contradictions(text: string, score: number | null): Place[] {
  if (score === null || (score > low && score < high)) return []
  const [against, along] = score >= high ? [blame, praise] : [praise, blame]
  return placesOf(text, along).length > 0 ? [] : placesOf(text, against)
}

export interface FlagFacts {
  /** The score the text stands for, 0 to 10: the reviewer's own, or the panel's mean; null where there is none. */
  score: number | null
  /** Those who read for the panel, and where they work. */
  readers: KnownNames
}

/**
 * What in a text to the investigators deserves a second look before they read it, in the order of the text. Only a
 * list of places: words are found by their form, and whether they are right is for the chair to say.
 */
export function textFlags(text: string, { score, readers }: FlagFacts): TextFlag[] {
  const kinds: [FlagKind, Place[]][] = [
    ['gives-away', giveawayPlaces(text)],
    ['names', namePlaces(text, readers)],
    ['tone', placesOf(text, harsh)],
    ['person', placesOf(text, persons)],
    ['scores', placesOf(text, inner)],
    ['contradicts', contradictions(text, score)],
  ]
  return kinds
    .flatMap(([kind, places]) => places.map((place) => ({ ...place, kind })))
    .sort((a, b) => a.at - b.at)
}
