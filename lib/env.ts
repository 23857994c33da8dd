import { z } from 'zod'

const httpUrl = z.url({ protocol: /^https?$/ })

const settings = z.object({
  NOCTUARY_MODE: z.enum(['demo', 'test', 'production']),
  DATABASE_URL: z.url({ protocol: /^mysql$/ }),
  S3_ENDPOINT: httpUrl,
  S3_REGION: z.string().min(1),
  S3_BUCKET: z.string().min(3),
  S3_ACCESS_KEY_ID: z.string().min(1),
  S3_SECRET_ACCESS_KEY: z.string().min(1),
  STRIPE_SECRET_KEY: z.string().min(8),
  STRIPE_WEBHOOK_SECRET: z.string().min(8),
  /** Only with the local payment mock; the real service needs none. */
  STRIPE_API_BASE: httpUrl.optional(),
  SMTP_URL: z.url({ protocol: /^smtps?$/ }),
  MAIL_FROM: z.string().min(3),
  /** Proves that a report about a letter comes from our mail server; without it none is taken. */
  MAIL_REPORT_SECRET: z.string().min(32).optional(),
  NEXTAUTH_URL: httpUrl,
  NEXTAUTH_SECRET: z.string().min(32),
  INBOX_URL: httpUrl.optional(),
  PAYMENT_MOCK_URL: httpUrl.optional(),
  LOG_LEVEL: z.enum(['debug', 'info', 'warn', 'error', 'silent']).default('info'),
  LETTER_RELAY_SECONDS: z
    .string()
    .regex(/^\d+(\.\d+)?$/)
    .default('5')
    .transform(Number),
})

export type Settings = z.output<typeof settings>

let parsed: Settings | undefined

/** The settings, parsed once; throws with the names of what is missing or wrong. */
export function env(): Settings {
  if (parsed) return parsed
  const result = settings.safeParse(process.env)
  if (!result.success) {
    const lines = result.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`)
    throw new Error(`Settings missing or wrong in the environment. ${lines.join('; ')}`)
  }
  parsed = result.data
  return parsed
}
