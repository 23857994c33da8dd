import { describe, expect, it } from 'vitest'
import { inOrder, requireFreeName, requireRoom } from '@/lib/domain/targets/rules'
import { splitPosition } from '@/lib/domain/targets/splitPosition'
import { Refusal } from '@/lib/errors'

const refusal = (act: () => void): Refusal | null => {
  try {
    act()
  } catch (error) {
    if (error instanceof Refusal) return error
    throw error
  }
  return null
}

describe('rules of targets', () => {
  it('refuses a name that is taken, whatever its case, at its field', () => {
    const targets = [{ id: 1, name: 'HE 0047−1756' }]
    expect(refusal(() => requireFreeName(targets, ' he 0047−1756 ', null))?.fieldErrors).toHaveProperty(
      'name',
    )
    expect(refusal(() => requireFreeName(targets, 'HE 0047−1756', 1))).toBeNull()
  })

  it('refuses more than 500', () => {
    expect(refusal(() => requireRoom(499, 1))).toBeNull()
    expect(refusal(() => requireRoom(499, 2))?.kind).toBe('invalid')
  })

  it('orders only by a list that names each once', () => {
    const targets = [{ id: 1 }, { id: 2 }]
    expect(inOrder(targets, [2, 1])).toEqual([{ id: 2 }, { id: 1 }])
    for (const ids of [[1], [1, 1], [1, 3], [1, 2, 3]]) expect(inOrder(targets, ids)).toBeNull()
  })

  it.each([
    ['00 50 27.83 −17 40 08.8', '00 50 27.83', '−17 40 08.8'],
    ['12.61596 -17.66911', '12.61596', '-17.66911'],
    ['12h29m06.7s +02d03m08.6s', '12h29m06.7s', '+02d03m08.6s'],
    ['187.28, 2.05', '187.28', '2.05'],
    ['12 29 06.7 02 03 08.6', '12 29 06.7', '02 03 08.6'],
  ])('splits %s', (text, ra, dec) => {
    expect(splitPosition(text)).toEqual({ ra, dec })
  })

  it('does not split one half', () => {
    expect(splitPosition('12 29 06.70')).toBeNull()
  })
})
