import 'server-only'
import { connect, type Database } from '@/db/client'
import { env } from '@/lib/env'
import type { Mail } from './mail/Mail'
import { smtpMail } from './mail/smtp'
import type { Payments } from './payments/Payments'
import { stripePayments } from './payments/stripe'
import type { ObjectStore } from './storage/ObjectStore'
import { s3Store } from './storage/s3'

export interface Services {
  db: Database
  storage: ObjectStore
  payments: Payments
  mail: Mail
}

// Kept across hot reloads: a new pool at every edit would exhaust the database's connections.
const kept = globalThis as typeof globalThis & { noctuaryServices?: Services }

/** The real services, opened once a process from the validated environment. */
export function services(): Services {
  if (kept.noctuaryServices) return kept.noctuaryServices
  const settings = env()
  kept.noctuaryServices = {
    db: connect(settings.DATABASE_URL),
    storage: s3Store({
      endpoint: settings.S3_ENDPOINT,
      region: settings.S3_REGION,
      bucket: settings.S3_BUCKET,
      accessKeyId: settings.S3_ACCESS_KEY_ID,
      secretAccessKey: settings.S3_SECRET_ACCESS_KEY,
    }),
    payments: stripePayments({
      secretKey: settings.STRIPE_SECRET_KEY,
      webhookSecret: settings.STRIPE_WEBHOOK_SECRET,
      apiBase: settings.STRIPE_API_BASE ?? null,
    }),
    mail: smtpMail({ url: settings.SMTP_URL, from: settings.MAIL_FROM }),
  }
  return kept.noctuaryServices
}
