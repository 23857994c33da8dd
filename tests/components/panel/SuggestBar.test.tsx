import { render, screen } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
import { SuggestBar } from '@/components/panel/SuggestBar'
import type { SuggestedPairs } from '@/lib/domain/assignments/suggestionWords'

// Seen to fail with the quorum put into the field whatever it is, and with nobody suggested called nothing missing.

const nothing = () => undefined
const shown = (quorum: number, suggestion: SuggestedPairs | null) =>
  render(
    <SuggestBar
      {...{ quorum, suggestion, busy: null, onSuggest: nothing, onAssign: nothing, onLeave: nothing }}
    />,
  )
const none = { pairs: [], loads: null, best: { why: 'No solver was asked.' }, known: null }

describe('a suggestion of readers', () => {
  it('begins with the quorum, no more than can be asked for', () => {
    shown(30, null)
    expect(screen.getByLabelText('Readers a proposal')).toHaveProperty('value', '14')
  })

  it('says that nobody is left where proposals lack readers', () => {
    shown(3, { ...none, short: [{ reviewNumber: '18-519', lacking: 3 }] })
    expect(screen.getByText(/^Nobody can be suggested/)).toBeTruthy()
    expect(screen.getByText(/too few may read 18-519 \(3 short\)/)).toBeTruthy()
  })

  it('says that nothing is missing only where nothing is', () => {
    shown(3, { ...none, short: [] })
    expect(screen.getByText(/^Nothing is missing/)).toBeTruthy()
  })
})
