import { onEveryStep, type StepName } from '@/lib/services/step'

/** Fails once; fails from there on; does its work and loses the answer. */
export type FaultMode = 'once' | 'for good' | 'answer lost'

export class InjectedFault extends Error {}

export interface Faulted<T> {
  /** Every step reached, in order. */
  steps: StepName[]
  /** What was answered; null when it failed. */
  answer: T | null
  error: unknown
}

/** Runs `work` with the step of this number (from 1) made to fail; 0 lets every step through and only counts. */
export async function withFault<T>(
  number: number,
  mode: FaultMode,
  work: () => Promise<T>,
): Promise<Faulted<T>> {
  const steps: StepName[] = []
  onEveryStep((name) => {
    steps.push(name)
    const isHit = steps.length === number || (mode === 'for good' && number > 0 && steps.length > number)
    if (!isHit) return undefined
    const fail = () => {
      throw new InjectedFault(`step ${steps.length}, ${name}`)
    }
    return mode === 'answer lost' ? fail : fail()
  })
  try {
    return { steps, answer: await work(), error: null }
  } catch (error) {
    return { steps, answer: null, error }
  } finally {
    onEveryStep(null)
  }
}
