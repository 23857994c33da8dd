import { mergeTexts, type Passage } from '@/lib/writing/mergeTexts'

export type Whose = 'theirs' | 'mine'

/** Three versions of the same fields: as both found them, as the other saved them, as they stand here. */
export interface Versions<Values> {
  base: Values
  theirs: Values
  mine: Values
}

/** One thing to choose: a field that differs, or a passage of a long text. */
export interface Choice {
  key: string
  field: string
  /** Which passage of how many to choose in this field; null for a whole field. */
  passage: { number: number; of: number } | null
  theirs: unknown
  mine: unknown
  changedBy: 'them' | 'me' | 'both'
}

const same = (a: unknown, b: unknown) => JSON.stringify(a ?? '') === JSON.stringify(b ?? '')

function passagesOf(values: Versions<object>, field: string): Passage[] | null {
  const [base, theirs, mine] = [values.base, values.theirs, values.mine].map(
    (version) => (version as Record<string, unknown>)[field],
  )
  if (typeof base !== 'string' || typeof theirs !== 'string' || typeof mine !== 'string') return null
  return mergeTexts(base, theirs, mine)
}

/**
 * What is to be chosen, field by field. Of a field written in prose only the passages that both changed are asked for;
 * where the two changed different passages, both changes are kept.
 */
export function choicesOf<Values extends object>(
  versions: Versions<Values>,
  fields: readonly (keyof Values & string)[],
  prose: readonly string[] = [],
): Choice[] {
  const { base, theirs, mine } = versions
  return fields.flatMap((field): Choice[] => {
    if (same(theirs[field], mine[field])) return []
    const passages = prose.includes(field) ? passagesOf(versions, field) : null
    if (passages) {
      const open = passages.flatMap((passage, index) =>
        passage.kind === 'both' ? [{ ...passage, index }] : [],
      )
      return open.map((passage, index) => ({
        key: `${field}.${passage.index}`,
        field,
        passage: { number: index + 1, of: open.length },
        theirs: passage.theirs,
        mine: passage.mine,
        changedBy: 'both',
      }))
    }
    const [byThem, byMe] = [!same(theirs[field], base[field]), !same(mine[field], base[field])]
    const changedBy = byThem && byMe ? 'both' : byThem ? 'them' : 'me'
    return [{ key: field, field, passage: null, theirs: theirs[field], mine: mine[field], changedBy }]
  })
}

/** The fields as chosen; what was not asked for is taken from whoever changed it. */
export function joined<Values extends object>(
  versions: Versions<Values>,
  fields: readonly (keyof Values & string)[],
  picks: Readonly<Record<string, Whose>>,
  prose: readonly string[] = [],
): Values {
  const result = { ...versions.mine }
  for (const field of fields) {
    if (same(versions.theirs[field], versions.mine[field])) continue
    const passages = prose.includes(field) ? passagesOf(versions, field) : null
    if (passages)
      Object.assign(result, {
        [field]: passages
          .map((passage, index) =>
            passage.kind === 'settled'
              ? passage.text
              : passage[picks[`${field}.${index}`] === 'theirs' ? 'theirs' : 'mine'],
          )
          .join(''),
      })
    else if (picks[field] === 'theirs') result[field] = versions.theirs[field]
  }
  return result
}
