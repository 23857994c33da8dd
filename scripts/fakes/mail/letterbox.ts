import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { simpleParser } from 'mailparser'

/** One letter as it arrived, read for people and for tests. */
export interface Letter {
  id: string
  receivedAt: string
  envelopeFrom: string
  /** The addresses it was delivered to, in lower case. */
  envelopeTo: string[]
  from: string
  to: string
  subject: string
  messageId: string
  text: string
  html: string
  attachments: { filename: string; contentType: string; size: number }[]
}

/** Keeps every letter as two files (the raw message and what was read from it), so a restart loses none. */
export class Letterbox {
  readonly #folder: string
  #letters: Letter[] = []
  #next = 1

  constructor(folder: string) {
    this.#folder = folder
    mkdirSync(folder, { recursive: true })
    for (const file of readdirSync(folder)
      .filter((name) => name.endsWith('.json'))
      .sort()) {
      this.#letters.push(JSON.parse(readFileSync(join(folder, file), 'utf8')))
      this.#next = Math.max(this.#next, Number.parseInt(file, 10) + 1)
    }
  }

  async deliver(raw: Buffer, envelopeFrom: string, envelopeTo: readonly string[]): Promise<Letter> {
    const number = this.#next
    this.#next += 1
    const id = String(number).padStart(6, '0')
    const parsed = await simpleParser(raw, { skipImageLinks: true })
    const to = parsed.to === undefined ? [] : [parsed.to].flat()
    const letter: Letter = {
      id,
      receivedAt: new Date().toISOString(),
      envelopeFrom,
      envelopeTo: envelopeTo.map((address) => address.toLowerCase()),
      from: parsed.from?.text ?? '',
      to: to.map((address) => address.text).join(', '),
      subject: parsed.subject ?? '',
      messageId: parsed.messageId ?? '',
      text: parsed.text ?? '',
      html: parsed.html || '',
      attachments: parsed.attachments.map(({ filename, contentType, size }) => ({
        filename: filename ?? 'unnamed',
        contentType,
        size,
      })),
    }
    writeFileSync(join(this.#folder, `${id}.eml`), raw)
    writeFileSync(join(this.#folder, `${id}.json`), JSON.stringify(letter, null, 2))
    this.#letters.push(letter)
    return letter
  }

  /** Newest first; `to` narrows to one recipient. */
  list(to?: string): Letter[] {
    const wanted = to?.toLowerCase()
    return this.#letters.filter((letter) => !wanted || letter.envelopeTo.includes(wanted)).reverse()
  }

  find(id: string): Letter | undefined {
    return this.#letters.find((letter) => letter.id === id)
  }

  raw(id: string): Buffer | undefined {
    return this.find(id) ? readFileSync(join(this.#folder, `${id}.eml`)) : undefined
  }

  empty(): void {
    for (const { id } of this.#letters) {
      rmSync(join(this.#folder, `${id}.eml`), { force: true })
      rmSync(join(this.#folder, `${id}.json`), { force: true })
    }
    this.#letters = []
  }
}
