'use client'

import type { FormAction } from '@/components/forms/actionFormTypes'
import { StepAside } from './StepAside'

export type LeaveReviewAction = FormAction<{ assignmentId: number; kind: string; reason: string }, unknown>

export interface LeaveReviewProps {
  assignmentId: number
  reviewNumber: string
  action: LeaveReviewAction
}

/** Leaves the review on the desk, for an interest found while reading. */
export function LeaveReview({ assignmentId, reviewNumber, action }: LeaveReviewProps) {
  return (
    <StepAside
      reviewNumber={reviewNumber}
      then="You are barred from it at once, and your review no longer counts."
      leave={(values) => action({ assignmentId, ...values })}
    />
  )
}
