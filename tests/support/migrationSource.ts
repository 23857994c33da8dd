import { basename } from 'node:path'
import type { Knex } from 'knex'

export interface Step {
  name: string
  up(knex: Knex): Promise<void>
  down(knex: Knex): Promise<void>
}

const modules = import.meta.glob<Omit<Step, 'name'>>('../../db/migrations/*.ts', { eager: true })

export const steps: Step[] = Object.entries(modules)
  .map(([path, step]) => ({ name: basename(path), up: step.up, down: step.down }))
  .sort((a, b) => a.name.localeCompare(b.name))

const migrationSource: Knex.MigrationSource<Step> = {
  getMigrations: async () => steps,
  getMigrationName: (step) => step.name,
  getMigration: async (step) => step,
}

/** How Knex runs the migrations inside a test, where its own loader would not read TypeScript. */
export const migrationSettings = { migrationSource, tableName: 'migrations' }
