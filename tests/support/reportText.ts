export interface ReportWish {
  action?: string
  status?: string
  diagnostic?: string
  /** As on the wire, in xtext; null leaves it out. */
  envelopeId?: string | null
  messageId?: string | null
  recipient?: string
  /** Media type of the part that gives the letter back. */
  returned?: string
  words?: string
}

/** A delivery status notification as RFC 3464 has them, about an invented letter. */
export function reportText(wish: ReportWish = {}): string {
  const { envelopeId = 'ab12@noctuary.example', messageId = '<ab12@noctuary.example>' } = wish
  return [
    'Return-Path: <>',
    'From: Mail Delivery System <MAILER-DAEMON@mx.tarnhead.example>',
    'To: proposals@quillonridge.example',
    'Subject: Undelivered Mail Returned to Sender',
    'Auto-Submitted: auto-replied',
    'MIME-Version: 1.0',
    'Content-Type: multipart/report; report-type=delivery-status;',
    '\tboundary="b1"',
    '',
    'This is a MIME-encapsulated message.',
    '',
    '--b1',
    'Content-Type: text/plain; charset=us-ascii',
    '',
    wish.words ?? 'Your letter could not be delivered.',
    '',
    '--b1',
    'Content-Type: message/delivery-status',
    '',
    'Reporting-MTA: dns; mx.tarnhead.example',
    ...(envelopeId === null ? [] : [`Original-Envelope-Id: ${envelopeId}`]),
    'Arrival-Date: Tue, 1 Dec 2026 10:00:00 +0000',
    '',
    `Final-Recipient: rfc822; ${wish.recipient ?? 'nobody@tarnhead.example'}`,
    `Action: ${wish.action ?? 'failed'}`,
    `Status: ${wish.status ?? '5.1.1'}`,
    `Diagnostic-Code: ${wish.diagnostic ?? 'smtp; 550 5.1.1 No such mailbox here'}`,
    '',
    '--b1',
    `Content-Type: ${wish.returned ?? 'message/rfc822'}`,
    '',
    ...(messageId === null ? [] : [`Message-ID: ${messageId}`]),
    'Subject: The letter',
    '',
    'Status: 5.9.9',
    '',
    '--b1--',
    '',
  ].join('\r\n')
}
