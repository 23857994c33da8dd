import { createElement } from 'react'
import { describe, expect, it } from 'vitest'
import { computeProposal } from '@/lib/domain/observations/computeProposal'
import { anonymise } from '@/lib/domain/packets/anonymise'
import { packetRules } from '@/lib/domain/packets/packetRules'
import type { Snapshot } from '@/lib/domain/submission/snapshot'
import type { ProposalContents } from '@/lib/domain/proposals/types'
import { wishLines } from '@/lib/domain/wishes/wishLines'
import { packetData } from '@/pdf/packet/packetData'
import { PacketDocument } from '@/pdf/packet/PacketDocument'
import { render } from '@/pdf/render'
import { contents, observation, slitMode, target } from '../../support/contents'
import { pdfText } from '../../support/pdfText'

function dataOf(over: Partial<ProposalContents>) {
  const whole = contents(over)
  const computation = computeProposal(whole)
  const snapshot = { contents: whole, computation, engineVersion: computation.engineVersion } as Snapshot
  const proposal = anonymise(snapshot)
  const given = { label: '14-083', people: [], required: whole.targets.length }
  return packetData(proposal, { ...given, rules: packetRules(proposal), wishes: wishLines(proposal) })
}

const law = { kind: 'power-law', index: -0.5, indexError: null } as const
const two = {
  targets: [target({ spectrum: law }), target({ id: 12, name: 'Lamp 12', redshift: 0.39 })],
  observations: [
    observation(),
    observation({ id: 22, targetId: 12 }),
    observation({ id: 23, targetId: 12, modeId: 8 }),
  ],
  modes: [slitMode, { ...slitMode, modeId: 8, name: 'LANTERN r', kind: 'imaging' as const, band: 'r' }],
}

// Seen to fail with a strip for images, and with the verdict of the whole request in place of that of the bands.
describe('the spectra of a packet', () => {
  it('are a strip for each mode with a slit, a row for each of its observations', () => {
    const { spectra } = dataOf(two)
    expect(spectra.map(({ modeName }) => modeName)).toEqual([slitMode.name])
    const [strip] = spectra
    expect(strip?.rows.map(({ name }) => name)).toEqual(['3C 273', 'Lamp 12'])
    const asked = strip?.rows.map(({ lines }) => lines.find(({ isAsked }) => isAsked)?.words)
    expect(asked).toEqual(['Hα 7,604', 'Hα 9,125'])
    // One stands in the oxygen A band, the other in a band of water.
    expect(strip?.rows.map(({ tone }) => tone)).toEqual(['not-feasible', 'not-feasible'])
    const clear = dataOf({ targets: [target({ redshift: 0.2 })] }).spectra[0]
    expect(clear?.rows[0]?.tone).toBe('feasible')
    for (const at of strip?.skyLinesA ?? []) expect(at >= (strip?.fromA ?? NaN)).toBe(true)
    expect(strip?.skyLinesA.length).toBeGreaterThan(50)
  })

  it('are none without a redshift or a slit', () => {
    expect(dataOf({ targets: [target({ redshift: null, redshiftTyped: '' })] }).spectra).toEqual([])
    expect(dataOf({ modes: [{ ...slitMode, kind: 'imaging', band: 'r' }] }).spectra).toEqual([])
  })

  it('are printed, with how magnitudes were carried', async () => {
    const data = dataOf(two)
    const text = pdfText(await render(() => createElement(PacketDocument, { data })))
    expect(text).toContain('Where the lines fall: SPINDLE red')
    expect(text).toContain('Hα 9,125')
    expect(text).toContain('oxygen A')
    expect(text).toMatch(/3C 273: Carried from r to 7,604.Å with α = −0.5: −0\.\d\d.mag\./)
  })
})

describe('magnitudes that were carried', () => {
  it('are told six at most, then counted', () => {
    const targets = Array.from({ length: 9 }, (_, i) =>
      target({ id: i + 1, name: `Lamp ${i}`, spectrum: law }),
    )
    const observations = targets.map(({ id }) => observation({ id: id + 100, targetId: id }))
    const { carried } = dataOf({ targets, observations })
    expect(carried).toHaveLength(7)
    expect(carried.at(-1)).toBe('And 3 more in the report.')
    expect(dataOf({}).carried).toEqual([expect.stringContaining('taken as flat in f_ν')])
  })
})

// Seen to fail with the visit left out of the facts.
describe('how time is wished for', () => {
  const { instrument } = slitMode
  const visit = { nights: 3, part: 'first', together: true } as const
  const wish = { id: 1, instrumentId: instrument.id, leastSeconds: 5400, visit, version: 1 }
  const valueOf = (over: Partial<ProposalContents>, term: string) =>
    dataOf(over).facts.find((fact) => fact.term === term)?.value

  it('is told with the facts, where something is said', () => {
    const over = { wishes: [wish, { ...wish, id: 2, instrumentId: instrument.id + 99 }] }
    expect(valueOf(over, 'Visit')).toBe(`three first halves of nights in a row with ${instrument.name}`)
    expect(valueOf(over, 'Of use from')).toMatch(new RegExp(`^1\\.5.h of ${instrument.name}$`))
    expect(valueOf({ wishes: [] }, 'Visit')).toBeUndefined()
    expect(valueOf({ wishes: [{ ...wish, visit: null }] }, 'Visit')).toBeUndefined()
  })
})
