'use client'

import { expectedOf } from '@/lib/domain/tools/yardstick/inverseFields'
import { quantityOf } from '@/lib/domain/tools/yardstick/quantities'
import type { YardstickState } from '@/lib/domain/tools/yardstick/state'
import { invertible } from '@/lib/domain/tools/yardstick/stateQuery'
import { pieces } from '@/lib/domain/tools/yardstick/firstValues'
import { countInWords } from '@/lib/format'
import { LedgerArea } from './LedgerArea'
import { PlainSelect } from './PlainSelect'

export interface InverseFieldsProps {
  state: YardstickState
  /** How many values were read, and sentences for the rest. */
  count: number
  troubles: readonly string[]
  onChange: (next: Partial<YardstickState>) => void
}

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1)
const options = invertible.map((value) => ({ value, label: capital(quantityOf(value)?.name ?? value) }))

/** Examples that suit a quantity, for a list that still holds those of another. */
function valuesFor(from: YardstickState['from'], before: YardstickState): string {
  const suits = expectedOf[from].unit === expectedOf[before.from].unit
  return suits ? before.values : expectedOf[from].example
}

/** The quantity known, and its values with any unit that fits. */
export function InverseFields({ state, count, troubles, onChange }: InverseFieldsProps) {
  const { example } = expectedOf[state.from]
  return (
    <div className="flex flex-col gap-6">
      <PlainSelect
        label="What you know"
        options={options}
        value={state.from}
        onChange={(from) => onChange({ from, values: valuesFor(from, state) })}
      />
      <LedgerArea
        label="Values"
        help={`One a line, in any unit: ${example}`}
        value={state.values}
        onChange={(values) => onChange({ values })}
        troubles={troubles}
        piece={pieces.quantities}
        read={`${countInWords(count, 'value', 'values', true)} read.`}
      />
    </div>
  )
}
