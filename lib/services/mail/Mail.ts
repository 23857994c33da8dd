export interface OutgoingLetter {
  messageId: string
  to: { email: string; name: string }
  subject: string
  text: string
  html: string
  attachments?: readonly { fileName: string; bytes: Uint8Array }[]
}

export interface Mail {
  /** Resolves once the mail server has taken the letter; rejects with what it said, for good as `LetterRefused`. */
  send(letter: OutgoingLetter): Promise<void>
  isUp(): Promise<boolean>
}
