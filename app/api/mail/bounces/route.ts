import { takeReport } from '@/lib/domain/bounces/takeReport'
import { refuse } from '@/lib/errors'
import { defineRoute } from '@/lib/http/defineRoute'
import { isReportSecret } from '@/lib/services/mail/isReportSecret'

/** Reports of the mail server about letters that came back later. Its secret is the only way in. */
export const POST = defineRoute({
  name: 'POST /api/mail/bounces',
  accepts: 'message/rfc822',
  maxBytes: 1_000_000,
  limit: { points: 600, seconds: 60 },
  run: async (ctx, { request, text }) => {
    if (!isReportSecret(request.headers.get('x-report-secret') ?? ''))
      throw refuse.forbidden('This needs the secret of the mail server.')
    return takeReport(ctx, text)
  },
})
