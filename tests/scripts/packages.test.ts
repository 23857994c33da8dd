import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { installedMatchesLock } from '@/scripts/prepare/packages.mjs'

let folder: string

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'packages-'))
  mkdirSync(join(folder, 'node_modules'))
})
afterEach(() => rmSync(folder, { recursive: true }))

function lock(packages: object): void {
  writeFileSync(join(folder, 'package-lock.json'), JSON.stringify({ packages: { '': {}, ...packages } }))
}

function installed(packages: object): void {
  writeFileSync(join(folder, 'node_modules', '.package-lock.json'), JSON.stringify({ packages }))
}

const wanted = {
  'node_modules/next': { version: '16.4.6' },
  'node_modules/sharp-for-another-system': { version: '1.0.0', optional: true },
}

// Seen to fail with versions not compared, and with a missing package taken as optional.
describe('whether the npm packages have to be installed', () => {
  it.each([
    ['fits, without the parts for other systems', { 'node_modules/next': { version: '16.4.6' } }, true],
    ['has another version', { 'node_modules/next': { version: '16.4.5' } }, false],
    ['lacks a package', {}, false],
  ])('when what is there %s', (_case, present, expected) => {
    lock(wanted)
    installed(present)
    expect(installedMatchesLock(folder)).toBe(expected)
  })

  it('takes an install that never finished as missing', () => {
    lock(wanted)
    expect(installedMatchesLock(folder)).toBe(false)
    writeFileSync(join(folder, 'node_modules', '.package-lock.json'), '{ "packages": {')
    expect(installedMatchesLock(folder)).toBe(false)
  })
})
