import { mkdtempSync, rmSync } from 'node:fs'
import { readFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'
import { startChild, untilReady } from '@/scripts/services/child'

const folder = mkdtempSync(join(tmpdir(), 'child-'))
afterAll(() => rmSync(folder, { recursive: true }))

function start(program: string) {
  return startChild({
    name: 'the lantern',
    command: process.execPath,
    args: ['-e', program],
    logFile: join(folder, 'lantern.log'),
  })
}

function isAlive(pid: number): boolean {
  try {
    process.kill(pid, 0)
    return true
  } catch {
    return false
  }
}

const forever = 'setInterval(() => {}, 1000)'

// Seen to fail with the service left running after its time was up, and with SIGTERM sent to it alone.
describe('a service as a process', () => {
  it('is put away when it never answers', async () => {
    const child = start(forever)
    await expect(untilReady(child, async () => false, 0.5)).rejects.toThrow(
      'The lantern did not answer within 0.5 s.',
    )
    expect(isAlive(child.pid)).toBe(false)
  })

  it('shows the end of its log when it ends while starting', async () => {
    const child = start("console.error('no oil'); process.exit(3)")
    await expect(untilReady(child, async () => false, 20)).rejects.toMatchObject({
      message: 'The lantern ended while starting.',
      details: ['no oil'],
    })
    expect(await child.ended).toEqual({ code: 3, signal: null })
  })

  it('stops with everything it has started itself', async () => {
    const spawnsOne = `const c = require('node:child_process').spawn(process.execPath, ['-e', ${JSON.stringify(forever)}]); console.log(c.pid); ${forever}`
    const child = start(spawnsOne)
    const grandchild = async () => Number(await readFile(child.logFile, 'utf8'))
    await expect.poll(grandchild, { timeout: 10_000 }).toBeGreaterThan(0)
    const pid = await grandchild()
    await child.stop()
    await expect.poll(() => isAlive(pid), { timeout: 5000 }).toBe(false)
  })

  it('is ended by force when it does not heed', async () => {
    const child = start(`process.on('SIGTERM', () => {}); console.log('ready'); ${forever}`)
    await expect.poll(() => readFile(child.logFile, 'utf8'), { timeout: 10_000 }).toContain('ready')
    await child.stop(300)
    expect(await child.ended).toEqual({ code: null, signal: 'SIGKILL' })
  })
})
