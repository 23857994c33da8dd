import { headerFields, mimePart, type MimePart } from './mimePart'

export interface ReportedRecipient {
  address: string
  action: 'failed' | 'delayed' | 'delivered' | 'relayed' | 'expanded' | 'other'
  /** Enhanced status code of RFC 3463, `5.1.1`. */
  status: string
  /** What the other server said; may be empty. */
  said: string
}

/** A delivery status notification, as far as it is asked about. */
export interface DeliveryReport {
  /** The envelope identifier that was sent along (RFC 3464, section 2.2.1). */
  envelopeId: string | null
  /** Message-ID of the letter, from the part that returns it. */
  messageId: string | null
  recipients: ReportedRecipient[]
}

const actions = new Set(['failed', 'delayed', 'delivered', 'relayed', 'expanded'])

/** The text after the type of a field such as `rfc822; ilse@tarnhead.example`. */
const afterType = (value: string | undefined): string => value?.replace(/^[^;]*;\s*/, '').trim() ?? ''

/** Undoes the xtext of RFC 3461, section 4: `+2B` is a plus sign. */
const fromXtext = (text: string): string =>
  text.replace(/\+([0-9A-F]{2})/g, (_, hex: string) => String.fromCharCode(parseInt(hex, 16)))

function recipientOf(fields: ReadonlyMap<string, string>): ReportedRecipient | null {
  const status = /^[245]\.\d{1,3}\.\d{1,3}/.exec(fields.get('status') ?? '')?.[0]
  if (!status) return null
  const action = (fields.get('action') ?? '').toLowerCase()
  return {
    address: afterType(fields.get('original-recipient') ?? fields.get('final-recipient')),
    action: (actions.has(action) ? action : 'other') as ReportedRecipient['action'],
    status,
    said: afterType(fields.get('diagnostic-code')),
  }
}

/** Groups of fields, parted by empty lines: the message's first, then one a recipient. */
function groupsOf(body: string): string[] {
  const groups: string[][] = []
  let open: string[] | null = null
  for (const line of body.split(/\r?\n/)) {
    if (line.trim() === '') open = null
    else if (open) open.push(line)
    else groups.push((open = [line]))
  }
  return groups.map((lines) => lines.join('\n'))
}

const find = (part: MimePart, mediaTypes: readonly string[]): MimePart | undefined =>
  part.parts.find(({ mediaType }) => mediaTypes.includes(mediaType))

/** Reads a message as a delivery status notification of RFC 3464; null when it is none. */
export function readReport(text: string): DeliveryReport | null {
  const message = mimePart(text)
  if (message.mediaType !== 'multipart/report') return null
  const status = find(message, ['message/delivery-status', 'message/global-delivery-status'])
  if (!status) return null
  const [first, ...others] = groupsOf(status.body).map(headerFields)
  const recipients = others.flatMap((fields) => recipientOf(fields) ?? [])
  if (!first || recipients.length === 0) return null
  const returned = find(message, [
    'message/rfc822',
    'text/rfc822-headers',
    'message/global',
    'message/global-headers',
  ])
  const envelopeId = first.get('original-envelope-id')
  return {
    envelopeId: envelopeId ? fromXtext(envelopeId) : null,
    messageId:
      (returned && headerFields(returned.body.split(/\r?\n\r?\n/)[0] ?? '').get('message-id')) ?? null,
    recipients,
  }
}
