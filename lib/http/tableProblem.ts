import { errorTable } from '@/lib/domain/observability/errorTable'
import { asRefusal } from './asRefusal'
import { statusOf } from './statusOf'

/** A failure as virtual-observatory clients read it: a VOTable, 400 for what was asked wrongly. */
export function tableProblem(error: unknown, requestId: string): Response {
  const refusal = asRefusal(error)
  const status = refusal ? statusOf[refusal.kind] : 500
  const wait = refusal?.retryAfterSeconds
  return new Response(
    errorTable(refusal ? refusal.message : `Something failed on our side. Reference ${requestId}.`),
    {
      status: status === 422 ? 400 : status,
      headers: {
        'content-type': 'application/x-votable+xml',
        'cache-control': 'no-store',
        ...(wait ? { 'retry-after': String(wait) } : {}),
      },
    },
  )
}
