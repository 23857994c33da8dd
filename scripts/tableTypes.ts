import { writeFile } from 'node:fs/promises'
import { connect } from '../db/client.ts'
import { tableTypes } from '../db/tableTypes.ts'

const url = process.env.MIGRATION_DATABASE_URL ?? process.env.DATABASE_URL
if (!url) throw new Error('DATABASE_URL is not set. Start the services first: npm run services.')

const db = connect(url)
await writeFile(new URL('../db/tables.ts', import.meta.url), await tableTypes(db))
await db.destroy()
