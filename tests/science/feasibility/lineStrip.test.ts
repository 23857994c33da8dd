import { describe, expect, it } from 'vitest'
import { lineStrip, linesOnStrip } from '../../../lib/science/feasibility'
import { slit } from '../support/instruments'

const mode = { ...slit, medium: 'vacuum', wavelengthMinA: 6000, wavelengthMaxA: 10_000 } as const
const halpha = { name: 'Hα', restA: 6564.61 }

// Seen to fail with the margin left out, and with the feature asked for dropped where it stands too near.
describe('where lines fall on a strip', () => {
  it('has the range of the mode with a margin, and the bands of the air cut to it', () => {
    const strip = lineStrip(mode, [{ redshift: 0.2, feature: halpha }])
    expect([strip.fromA, strip.toA]).toEqual([5760, 10_240])
    expect(strip.mode).toEqual({ fromA: 6000, toA: 10_000 })
    expect(strip.bands.map(({ name }) => name)).toEqual(['oxygen B', 'water', 'oxygen A', 'water', 'water'])
    const cut = lineStrip({ ...mode, wavelengthMinA: 7650, wavelengthMaxA: 7690 }, [])
    expect(cut.bands).toEqual([
      { name: 'oxygen A', fromA: expect.closeTo(7647.6, 6), toA: expect.closeTo(7692.4, 6), isHeavy: false },
    ])
  })

  it('is wide enough for a feature outside the range', () => {
    const strip = lineStrip(mode, [
      { redshift: 0.2, feature: halpha },
      { redshift: 1, feature: halpha },
    ])
    expect(strip.toA).toBeCloseTo(2 * 6564.61 + 240, 6)
    expect(strip.bands.at(-1)).toMatchObject({ name: 'water', isHeavy: false, toA: 11_600 })
  })

  it('holds the feature asked for first, and no two lines nearer than they may stand', () => {
    const asked = { redshift: 0.2, feature: halpha }
    const strip = lineStrip(mode, [asked])
    const lines = linesOnStrip(strip, asked, 200)
    expect(lines[0]).toEqual({ name: 'Hα', atA: expect.closeTo(7877.532, 6), isAsked: true })
    // Both lines of nitrogen stand within 25 A of it.
    expect(lines.map(({ name }) => name)).not.toContain('[N II] 6585')
    expect(lines.map(({ name }) => name)).toContain('Na D')
    const places = lines.map(({ atA }) => atA).sort((a, b) => a - b)
    for (const [index, atA] of places.entries())
      expect(atA - (places[index - 1] ?? 0)).toBeGreaterThanOrEqual(200)
    expect(linesOnStrip(strip, { redshift: 0.2, feature: null }, 200).some(({ isAsked }) => isAsked)).toBe(
      false,
    )
  })
})
