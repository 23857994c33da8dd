import { beforeEach, describe, expect, it, vi } from 'vitest'

vi.mock('@/lib/env', () => ({ env: () => ({ NOCTUARY_MODE: 'production' }) }))

const load = () => import('@/lib/auth/limits')
let limits: Awaited<ReturnType<typeof load>>
beforeEach(async () => {
  vi.resetModules()
  limits = await load()
})

const tries = async (count: number, email: string, address: string) => {
  for (let n = 0; n < count; n += 1) await limits.limitSignIn(email, address)
}

// Seen to fail with the success counted as a try, which locked out whoever signs in six times.
describe('tries to sign in', () => {
  it('end for an account after five failures, with the time to wait', async () => {
    await tries(5, 'ilse@tarnhead.example', '192.0.2.1')
    await expect(limits.limitSignIn('ILSE@tarnhead.example', '192.0.2.1')).rejects.toMatchObject({
      kind: 'too-many',
      retryAfterSeconds: expect.closeTo(900, -1),
    })
  })

  it('of a stranger do not lock the owner out elsewhere', async () => {
    await tries(5, 'ilse@tarnhead.example', '192.0.2.1')
    await expect(limits.limitSignIn('ilse@tarnhead.example', '192.0.2.2')).resolves.toBeUndefined()
  })

  it('end for an address after thirty failures, whoever they were for', async () => {
    for (let n = 0; n < 30; n += 1) await tries(1, `person${n}@tarnhead.example`, '192.0.2.1')
    await expect(limits.limitSignIn('other@tarnhead.example', '192.0.2.1')).rejects.toMatchObject({
      kind: 'too-many',
    })
  })

  it('that succeed count against nobody', async () => {
    for (let n = 0; n < 100; n += 1) {
      await limits.limitSignIn('ilse@tarnhead.example', '192.0.2.1')
      await limits.forgiveSignIn('ilse@tarnhead.example', '192.0.2.1')
    }
    await expect(limits.limitSignIn('other@tarnhead.example', '192.0.2.1')).resolves.toBeUndefined()
  })
})
