import { connect } from '../db/client.ts'
import { checkChain } from '../lib/domain/logbook/checkChain.ts'

// Ends with 1 when the chain is broken, so that a watch can call it.
const url = process.env.DATABASE_URL
if (!url) throw new Error('DATABASE_URL is not set. By hand, take it from .data/dev/env.json.')

const db = connect(url)
try {
  const { rows, fault } = await checkChain(db, null)
  console.log(
    fault
      ? `The logbook is not whole: after ${rows} sound rows, ${fault}.`
      : `The logbook is whole: ${rows} rows, each from the one before.`,
  )
  if (fault) process.exitCode = 1
} finally {
  await db.destroy()
}
