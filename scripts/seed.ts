import { connect } from '../db/client.ts'
import { seedDemo } from '../db/seeds/demo.ts'

const url = process.env.DATABASE_URL
if (!url)
  throw new Error('DATABASE_URL is not set. `npm start` sets it; by hand, take it from .data/dev/env.json.')
if (process.env.NOCTUARY_MODE === 'production')
  throw new Error(
    'The demonstration is never seeded into production. Remove NOCTUARY_MODE=production to use it.',
  )

const db = connect(url)
try {
  const isNew = await seedDemo(db, new Date())
  console.log(isNew ? 'Demonstration seeded.' : 'Demonstration already there.')
} finally {
  await db.destroy()
}
