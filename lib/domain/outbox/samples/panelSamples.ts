import { paths } from '@/lib/paths'
import { paperReplacedForReader } from '../letters/paperReplacedForReader'
import { readerLost } from '../letters/readerLost'
import { reviewReminder } from '../letters/reviewReminder'
import { reviewsAssigned } from '../letters/reviewsAssigned'
import { staffAnswer } from '../letters/staffAnswer'
import type { LetterSample } from './letterSample'

/** Letters to the panel and to instrument scientists: by review number. All are tried on the chair. */
export const panelSamples: readonly LetterSample[] = [
  {
    template: 'reviews-assigned',
    title: 'Reviews are assigned; to the reviewer',
    build: ({ of, origin }) =>
      of.reviewNumber === null || of.chair === null
        ? null
        : reviewsAssigned(
            { name: of.chair },
            {
              callNumber: of.call.number,
              reviewNumbers: [of.reviewNumber],
              pages: 10,
              dueAt: of.call.reviewsDueAt,
              urgent: false,
            },
            origin + paths.reviews(),
          ),
  },
  {
    template: 'review-reminder',
    title: 'Reviews are owed; to the reviewer',
    build: ({ of, origin }) =>
      of.reviewNumber === null || of.chair === null
        ? null
        : reviewReminder(
            { name: of.chair },
            {
              callNumber: of.call.number,
              reviewNumbers: [of.reviewNumber],
              dueAt: of.call.reviewsDueAt,
              isLate: false,
            },
            origin + paths.reviews(),
          ),
  },
  {
    template: 'reader-lost',
    title: 'A reviewer has an interest; to the chair',
    build: ({ of, origin }) =>
      of.reviewNumber === null || of.chair === null
        ? null
        : readerLost({
            name: of.chair,
            reviewer: 'A reviewer',
            callNumber: of.call.number,
            proposals: [{ reviewNumber: of.reviewNumber, readersLeft: 2 }],
            dueAt: of.call.reviewsDueAt,
            url: origin + paths.panel(of.call.slug, 'assignments'),
          }),
  },
  {
    template: 'paper-replaced',
    title: 'A justification was replaced; to its reviewers',
    build: ({ of, origin }) =>
      of.reviewNumber === null || of.chair === null
        ? null
        : paperReplacedForReader({ name: of.chair, reviewNumber: of.reviewNumber }, origin + paths.reviews()),
  },
  {
    template: 'staff-answer',
    title: 'A question was answered; to the instrument scientist',
    build: ({ of, origin }) =>
      of.reviewNumber === null || of.chair === null || !of.question?.answer
        ? null
        : staffAnswer({
            name: of.chair,
            reviewNumber: of.reviewNumber,
            answer: of.question.answer,
            url: origin + paths.assessments(),
          }),
  },
]
