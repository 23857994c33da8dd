import type { Knex } from 'knex'

const paper = (knex: Knex, rule: 'NULL' | 'NOT NULL', comment: string) =>
  knex.raw(`ALTER TABLE proposal_versions MODIFY paper_id INT UNSIGNED ${rule} COMMENT '${comment}'`)

export async function up(knex: Knex): Promise<void> {
  await paper(knex, 'NULL', 'justification sent as a document; null where it was written here')
}

export async function down(knex: Knex): Promise<void> {
  await paper(knex, 'NOT NULL', 'justification sent')
}
