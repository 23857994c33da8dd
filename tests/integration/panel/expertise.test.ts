import { beforeEach, describe, expect, it } from 'vitest'
import { assignmentsView } from '@/lib/domain/assignments/assignmentsView'
import { readAssignments } from '@/lib/domain/assignments/readAssignments'
import { suggestForPanel } from '@/lib/domain/assignments/suggestForPanel'
import { suggestionWords } from '@/lib/domain/assignments/suggestionWords'
import type { Actor } from '@/lib/domain/actor'
import { readExpertise } from '@/lib/domain/expertise/readExpertise'
import { saveExpertise } from '@/lib/domain/expertise/saveExpertise'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall, type PanelProposalMade } from '../../support/panelCall'

const db = useRolledBackDatabase()
let call: PanelCall
let lens: PanelProposalMade
let gas: PanelProposalMade

const about = (proposal: PanelProposalMade, category: string, title: string) =>
  db()('proposal_versions')
    .where({ proposal_id: proposal.id })
    .update({
      snapshot: db().raw(
        "JSON_SET(snapshot, '$.contents.category', ?, '$.contents.title', ?, '$.contents.abstract', '')",
        [category, title],
      ) as unknown as string,
    })
const say = (who: Actor, levels: [string, number][], words: string[] = []) =>
  saveExpertise(call.as(who), { levels: new Map(levels), words })
const suggested = async () => {
  const suggestion = await suggestForPanel(call.as(call.chair), { panelId: call.panelId, each: 1 })
  return { words: suggestionWords(suggestion), pairs: suggestion.pairs }
}

beforeEach(async () => {
  call = await makePanelCall(db(), [20, 10])
  ;[lens, gas] = call.proposals as [PanelProposalMade, PanelProposalMade]
  await about(lens, 'Gravitational lenses', 'A time delay')
  await about(gas, 'Gas within and between galaxies', 'Metals in haloes')
})

describe('saying what one knows', () => {
  it('is read back, replaced as a whole, and logged by how much it is', async () => {
    const [who] = call.reviewers
    expect((await readExpertise(call.as(who))).hasStated).toBe(false)
    await say(who, [['Gravitational lenses', 3]], ['arc', 'quasar'])
    await say(who, [['Surveys and maps', 2]], ['quasar'])
    const { hasStated, values } = await readExpertise(call.as(who))
    expect(hasStated).toBe(true)
    expect(values.words).toBe('quasar')
    expect(values.levels).toMatchObject({ 'gravitational-lenses': '0', 'surveys-and-maps': '2' })
    const row = await db()('logbook').where({ action: 'saveExpertise' }).orderBy('id', 'desc').first()
    expect(row).toBeDefined()
    expect(JSON.stringify(row)).not.toContain('quasar')
  })

  it('is for reviewers', async () => {
    await expect(saveExpertise(call.as(call.pi), { levels: new Map(), words: [] })).rejects.toMatchObject({
      kind: 'forbidden',
    })
  })
})

describe('affinity', () => {
  it('decides who is suggested, and what cannot be met is said', async () => {
    const [first, second, third] = call.reviewers
    expect((await suggested()).words).toMatch(/no reviewer has said what they know, so the loads decide/)
    await say(second, [['Gravitational lenses', 3]])
    await say(third, [['Gas within and between galaxies', 1]], ['metal'])
    const one = await suggested()
    expect(new Map(one.pairs.map((pair) => [pair.proposalId, pair.personId]))).toEqual(
      new Map([
        [lens.id, second.personId],
        [gas.id, third.personId],
      ]),
    )
    expect(one.words).toMatch(/one reviewer has not said what they know and counts as knowing none of it/)
    await db()('expertise').where({ person_id: second.personId }).delete()
    await say(first, [['Surveys and maps', 1]])
    expect((await suggested()).words).toContain(
      `nobody who may read them knows the subject of ${lens.reviewNumber}`,
    )
  })

  it('stands in the chair’s table by reviewer, and is nothing for who has not said', async () => {
    await say(call.reviewers[1], [['Gravitational lenses', 2]], ['time delays', 'metal'])
    const view = assignmentsView.parse(
      await readAssignments(call.as(call.chair), { callSlug: call.callSlug }),
    )
    const place = view.reviewers.findIndex(({ personId }) => personId === call.reviewers[1].personId)
    const row = view.rows.find(({ proposalId }) => proposalId === lens.id)
    // Level 2 of 4, and one of two words of the same weight: 1 - 0.5 (1 - 1/sqrt 2).
    expect(row?.affinities[place]).toBeCloseTo(0.85, 2)
    expect(row?.affinities.filter((value) => value !== null)).toHaveLength(1)
    expect(view.reviewers.map(({ hasStated }) => hasStated).filter(Boolean)).toHaveLength(1)
  })
})
