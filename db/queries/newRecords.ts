import type { Database } from '../client.ts'

interface Named {
  slug: string
  name: string
}

const keyOf = (keys: readonly number[], what: string): number => {
  const [id] = keys
  if (id === undefined) throw new Error(`${what} gave no key`)
  return id
}

export const insertSite = async (db: Database, { slug, name }: Named): Promise<number> =>
  keyOf(await db('sites').insert({ slug, name }), 'sites')

export const insertTelescope = async (db: Database, siteId: number, { slug, name }: Named): Promise<number> =>
  keyOf(await db('telescopes').insert({ site_id: siteId, slug, name }), 'telescopes')

export const insertInstrument = async (
  db: Database,
  telescopeId: number,
  { slug, name, summary }: Named & { summary: string },
): Promise<number> =>
  keyOf(await db('instruments').insert({ telescope_id: telescopeId, slug, name, summary }), 'instruments')

export const insertMode = async (
  db: Database,
  instrumentId: number,
  { slug, name }: Named,
): Promise<number> =>
  keyOf(await db('instrument_modes').insert({ instrument_id: instrumentId, slug, name }), 'instrument_modes')
