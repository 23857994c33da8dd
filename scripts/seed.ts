import { connect } from '../db/client.ts'
import { seedDemo } from '../db/seeds/demo.ts'
import { recordPast } from './fakes/payments/recordPast.ts'
import { s3Store } from '../lib/services/storage/s3.ts'

const url = process.env.DATABASE_URL
if (!url)
  throw new Error('DATABASE_URL is not set. `npm start` sets it; by hand, take it from .data/dev/env.json.')
if (process.env.NOCTUARY_MODE === 'production')
  throw new Error(
    'The demonstration is never seeded into production. Remove NOCTUARY_MODE=production to use it.',
  )

const setting = (name: string) => {
  const value = process.env[name]
  if (!value)
    throw new Error(`${name} is not set. \`npm start\` sets it; by hand, take it from .data/dev/env.json.`)
  return value
}

const storage = s3Store({
  endpoint: setting('S3_ENDPOINT'),
  region: setting('S3_REGION'),
  bucket: setting('S3_BUCKET'),
  accessKeyId: setting('S3_ACCESS_KEY_ID'),
  secretAccessKey: setting('S3_SECRET_ACCESS_KEY'),
})

const db = connect(url)
try {
  const isNew = await seedDemo(db, new Date(), {
    storage,
    origin: setting('NEXTAUTH_URL'),
    recordPast: (payments) => recordPast(setting('PAYMENT_MOCK_URL'), payments),
  })
  console.log(isNew ? 'Demonstration seeded.' : 'Demonstration already there.')
} finally {
  await db.destroy()
}
