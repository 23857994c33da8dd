import { describe, expect, it } from 'vitest'
import { readReport } from '@/lib/domain/bounces/readReport'
import { outcomeOf, saidWords, worstOf } from '@/lib/domain/bounces/rules'
import { reportText } from '../../support/reportText'

// The form is that of RFC 3464, section 2 and appendix E; addresses are invented.
// Seen to fail: with folded fields cut off, with the human's words read as fields, and with xtext left as it was.

describe('a report about a letter', () => {
  it('is read whole: the names it goes by, and each recipient', () => {
    expect(readReport(reportText())).toEqual({
      envelopeId: 'ab12@noctuary.example',
      messageId: '<ab12@noctuary.example>',
      recipients: [
        {
          address: 'nobody@tarnhead.example',
          action: 'failed',
          status: '5.1.1',
          said: '550 5.1.1 No such mailbox here',
        },
      ],
    })
  })

  it('is read with header fields alone given back, with lines of a Unix file, and with a folded answer', () => {
    const read = readReport(
      reportText({
        returned: 'text/rfc822-headers',
        diagnostic: 'smtp; 550 5.1.1 No such\r\n  mailbox here',
        envelopeId: 'a+2Bb@noctuary.example',
      }).replaceAll('\r\n', '\n'),
    )
    expect(read).toMatchObject({ envelopeId: 'a+b@noctuary.example', messageId: '<ab12@noctuary.example>' })
    expect(read?.recipients[0]?.said).toBe('550 5.1.1 No such mailbox here')
  })

  it('takes nothing from the words for people', () => {
    const words =
      'Original-Envelope-Id: other\r\n\r\nFinal-Recipient: rfc822; x@y.example\r\nAction: failed\r\nStatus: 5.0.0'
    expect(readReport(reportText({ words }))?.envelopeId).toBe('ab12@noctuary.example')
    expect(readReport(reportText({ words }))?.recipients).toHaveLength(1)
  })

  it.each([
    ['a letter of a person', 'From: a@b.example\r\nSubject: Re: x\r\n\r\nThank you.'],
    [
      'a report about reading',
      reportText().replace('message/delivery-status', 'message/disposition-notification'),
    ],
    ['a report of another kind', reportText().replace('multipart/report', 'multipart/mixed')],
    ['one without a status', reportText().replace('Status: 5.1.1', 'X-Status: 5.1.1')],
    ['nothing', ''],
    ['a boundary that never comes', reportText().replaceAll('--b1', '--b2')],
    [
      'a nest of parts',
      'Content-Type: multipart/report; boundary=a\n\n' +
        '--a\nContent-Type: multipart/mixed; boundary=a\n\n'.repeat(50),
    ],
  ])('is not seen in %s', (_, text) => expect(readReport(text)).toBeNull())

  it('is refused within a second, however odd the bytes', () => {
    const began = performance.now()
    readReport(reportText({ diagnostic: `smtp; ${' \t'.repeat(400_000)}` }))
    readReport(`Content-Type: multipart/report; boundary=${';boundary='.repeat(80_000)}`)
    expect(performance.now() - began).toBeLessThan(1000)
  })
})

describe('what a report means', () => {
  const worst = (over: Parameters<typeof reportText>[0]) =>
    worstOf(readReport(reportText(over)) ?? expect.fail('none'))

  it.each([
    ['failed', '5.1.1', 'bounced'],
    ['failed', '5.7.1', 'bounced'],
    ['failed', '4.4.7', 'parked'],
    ['delayed', '4.4.1', 'noted'],
  ] as const)('%s with %s: %s', (action, status, outcome) => {
    expect(outcomeOf('sent', worst({ action, status }) ?? expect.fail('none'))).toBe(outcome)
  })

  it.each(['queued', 'sending', 'parked', 'bounced', 'cancelled'] as const)(
    'nothing for a letter that is %s',
    (state) => {
      expect(outcomeOf(state, worst({}) ?? expect.fail('none'))).toBe('known')
    },
  )

  it('is nothing where it arrived, and is kept without control characters', () => {
    expect(worst({ action: 'delivered', status: '2.0.0' })).toBeNull()
    const said = saidWords({
      address: '',
      action: 'failed',
      status: '5.1.1',
      said: 'no\u0000 such\u001b[31m box',
    })
    expect(said).toBe('5.1.1: no  such [31m box')
  })
})
