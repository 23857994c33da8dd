import { beforeEach, describe, expect, it } from 'vitest'
import { answerQuestion } from '@/lib/domain/assessments/answerQuestion'
import { askQuestion } from '@/lib/domain/assessments/askQuestion'
import { readRequestLines } from '@/lib/domain/assessments/readRequestLines'
import { readStaffQuestions } from '@/lib/domain/assessments/readStaffQuestions'
import { makeClosedCall, type ClosedCall } from '../../support/closedCall'
import { useRolledBackDatabase } from '../../support/database'

const db = useRolledBackDatabase()
let call: ClosedCall
beforeEach(async () => {
  call = await makeClosedCall(db())
})

const ask = () =>
  askQuestion(call.as(call.scientist), {
    requestId: call.requestId,
    question: 'Must the slit cover both images, and at which angle?',
    withinDays: 4,
  })
const answer = (questionId: number, by = call.pi) =>
  answerQuestion(call.as(by), { reference: call.reference, questionId, answer: 'Both, at 152 degrees.' })
const letters = (template: string) => db()('outbox').where({ template })

describe('a question to the investigators', () => {
  it('goes to the principal investigator by letter, without a name of the staff', async () => {
    await ask()
    const [letter, ...more] = await letters('staff-question')
    expect(more).toEqual([])
    expect(letter?.to_email).toBe(call.pi.email)
    expect(letter?.text_body).toContain('Must the slit cover both images')
    expect(letter?.text_body).not.toContain(call.scientist.name)
    expect(await readStaffQuestions(call.as(call.coInvestigator), call.reference)).toMatchObject({
      questions: [{ answer: null }],
      mayAnswer: true,
    })
    expect(await readRequestLines(call.as(call.scientist))).toMatchObject([{ question: 'asked' }])
  })

  it('is answered once, dated, and the answer goes back without names', async () => {
    const { questionId } = await ask()
    await answer(questionId)
    const [letter] = await letters('staff-answer')
    expect(letter?.to_email).toBe(call.scientist.email)
    expect(letter?.subject).toContain(call.reviewNumber)
    for (const secret of [call.pi.name, call.reference, 'Sollvik'])
      expect(`${letter?.subject}${letter?.text_body}`).not.toContain(secret)
    const [question] = (await readStaffQuestions(call.as(call.pi), call.reference)).questions
    expect(question?.answer).toBe('Both, at 152 degrees.')
    expect(question?.answeredAt).toBeInstanceOf(Date)
    expect(await readRequestLines(call.as(call.scientist))).toMatchObject([{ question: 'answered' }])
    await expect(answer(questionId)).rejects.toMatchObject({
      kind: 'invalid',
      fieldErrors: { answer: expect.stringContaining('already') },
    })
  })

  it('is not there for a stranger, and not answered under another proposal', async () => {
    const { questionId } = await ask()
    await expect(answer(questionId, call.stranger)).rejects.toMatchObject({ kind: 'not-found' })
    expect(await readStaffQuestions(call.as(call.stranger), call.reference)).toEqual({
      questions: [],
      mayAnswer: false,
    })
    const other = answerQuestion(call.as(call.pi), { reference: 'ZZZ-ZZZ', questionId, answer: 'x' })
    await expect(other).rejects.toMatchObject({ kind: 'not-found' })
  })
})
