'use client'

import { useRouter } from 'next/navigation'
import { useEffect, useEffectEvent, useRef, useState } from 'react'
import type { z } from 'zod'
import { formatBytes } from '@/lib/format'
import type { FileSending } from './FileRow'
import { fingerprint } from './fingerprint'
import { sendForm } from './sendForm'

interface Journey extends FileSending {
  /** For those who hear the page: three sentences a file, not one a per cent. */
  spoken: string
}

/** A file that did not arrive and can be sent again. */
export interface Waiting {
  file: File
  words: string
  why: 'stopped' | 'failed' | 'offline'
}

export interface FileJourneyOptions<Data> {
  to: string
  fields: Readonly<Record<string, string | number>>
  deed: string
  reply: z.ZodType<Data>
  onKept: (data: Data) => void
  /** What is wrong with the file itself. */
  onRefused: (sentence: string) => void
}

const unchanged = 'Nothing was changed.'

function wordsOfLost(file: File, sentBytes: number): string {
  const far = sentBytes >= file.size
  const where = far
    ? 'before the observatory answered'
    : `after ${formatBytes(sentBytes)} of ${formatBytes(file.size)}`
  return `The connection was lost ${where}. ${far ? 'The file may have arrived.' : unchanged}`
}

/** Sends a file and keeps it until it has arrived: how far it is, stopping it, and sending it again. */
export function useFileJourney<Data>(options: FileJourneyOptions<Data>) {
  const [sending, setSending] = useState<Journey | null>(null)
  const [waiting, setWaiting] = useState<Waiting | null>(null)
  const journey = useRef<AbortController | null>(null)
  const router = useRouter()

  const send = async (file: File, isAgain = false) => {
    const own = new AbortController()
    journey.current?.abort()
    journey.current = own
    const total = formatBytes(file.size)
    const onStop = () => own.abort()
    let sent = 0
    const show = (next: number) => {
      sent = Math.min(file.size, next)
      const done = sent >= file.size
      const words = done ? `All ${total} sent; ${options.deed}` : `${formatBytes(sent)} of ${total} sent`
      const share = sent / file.size
      const spoken = done
        ? words
        : share < 0.5
          ? `Sending ${file.name}, ${total}`
          : `Half of ${file.name} is sent`
      setSending({ share, words, spoken, ...(done ? {} : { onStop }) })
    }
    const wait = (words: string, why: Waiting['why'] = 'failed') => setWaiting({ file, words, why })
    setWaiting(null)
    show(0)
    try {
      const body = new FormData()
      const sha256 = await fingerprint(file)
      const fields = { ...options.fields, sha256, sizeBytes: file.size, ...(isAgain ? { again: 'yes' } : {}) }
      for (const [name, value] of Object.entries(fields)) body.set(name, String(value))
      body.set('file', file)
      const reply = await sendForm(options.to, body, {
        signal: own.signal,
        // The fields around the file are some hundred bytes: its share of what has gone is the file's.
        onSent: (bytes, all) => show(Math.round((file.size * bytes) / all)),
      })
      if (reply.kind === 'kept') {
        options.onKept(options.reply.parse(reply.data))
        // Never after a loss: a refresh that fails loads the page anew, and the chosen file with it is gone.
        router.refresh()
      } else if (reply.kind === 'lost') wait(wordsOfLost(file, sent), navigator.onLine ? 'failed' : 'offline')
      else if (reply.again) wait(reply.message)
      else options.onRefused(reply.message)
    } catch {
      if (journey.current !== own) return
      if (own.signal.aborted) wait(`Stopped after ${formatBytes(sent)} of ${total}. ${unchanged}`, 'stopped')
      else wait('The file could not be read or sent.')
    } finally {
      if (journey.current === own) setSending(null)
    }
  }

  const sendAgain = () => {
    if (waiting) void send(waiting.file, true)
  }
  const onBack = useEffectEvent(sendAgain)
  const isOffline = waiting?.why === 'offline'
  useEffect(() => {
    if (!isOffline) return
    const back = () => onBack()
    window.addEventListener('online', back, { once: true })
    return () => window.removeEventListener('online', back)
  }, [isOffline])

  return { sending, waiting, send, sendAgain }
}
