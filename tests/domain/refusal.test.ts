import { describe, expect, it, vi } from 'vitest'
import { Refusal, refuse } from '@/lib/errors'

// Seen to fail with the mark left out: the second copy of the class is what the built server has in another bundle.
describe('a refusal', () => {
  it('is known as one whichever copy of the class made it', async () => {
    vi.resetModules()
    const other = await import('@/lib/errors')
    expect(other.Refusal).not.toBe(Refusal)
    expect(other.refuse.closed('Too late.')).toBeInstanceOf(Refusal)
    expect(refuse.closed('Too late.')).toBeInstanceOf(other.Refusal)
  })

  it.each([null, undefined, 'closed', new Error('closed'), { kind: 'closed' }])(
    'is nothing else: %s',
    (value) => {
      expect(value instanceof Refusal).toBe(false)
    },
  )

  it('cannot be made by what comes from outside', () => {
    expect((JSON.parse('{"noctuary.refusal": true}') as unknown) instanceof Refusal).toBe(false)
  })
})
