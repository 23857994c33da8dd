import { describe, expect, it } from 'vitest'
import { access } from '@/lib/auth/access'
import { filePolicy } from '@/lib/http/filePolicy'

// Seen to fail with the policy of pages given to everything, as handlers' own policies were lost to it.

const concrete = (path: string) => path.replace(/\[\w+\]/g, 'x1')
const routes = Object.keys(access.routes)
const files = routes.filter((name) => /^GET \/(?!api\/)/.test(name)).map((name) => name.slice(4))

describe('the content policy', () => {
  it('of every file lets nothing run or load', () => {
    expect(files.length).toBeGreaterThan(15)
    const loose = (path: string) =>
      !/^(sandbox; )?default-src 'none'; /.test(filePolicy(concrete(path)) ?? '')
    expect(files.filter(loose)).toEqual([])
  })

  it('locks letters in, and no PDF, which a browser would then not show', () => {
    expect(filePolicy('/office/mail/7/html')).toMatch(/^sandbox; /)
    expect(filePolicy('/proposals/ABC-123/packet')).not.toContain('sandbox')
  })

  it('of pages and of the API is not that of a file', () => {
    expect(Object.keys(access.pages).filter((path) => filePolicy(concrete(path)))).toEqual([])
    expect(filePolicy('/api/v1/cosmology')).toBeNull()
    expect(filePolicy('/proposals/ABC-123/calendarXics')).toBeNull()
    expect(filePolicy('/proposals/ABC-123/packet/more')).toBeNull()
  })
})
