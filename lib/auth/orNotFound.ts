import 'server-only'
import { notFound } from 'next/navigation'
import { Refusal } from '@/lib/errors'

/** Awaits a page's main read; what is not there, or not theirs to see, becomes the not-found page. */
export async function orNotFound<T>(read: Promise<T>): Promise<T> {
  try {
    return await read
  } catch (error) {
    if (error instanceof Refusal && (error.kind === 'not-found' || error.kind === 'forbidden')) notFound()
    throw error
  }
}
