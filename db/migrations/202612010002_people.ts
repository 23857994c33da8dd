import type { Knex } from 'knex'
import { createdAt, exactText, instant, reference, version } from '../columns.ts'

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable('people', (t) => {
    t.comment('Everyone with an account; a name may be a single name')
    t.increments('id').comment('key')
    t.string('email', 254).notNullable().unique().comment('address used to sign in, compared without case')
    t.string('name', 160).notNullable().comment('full name as the person writes it')
    t.string('sort_name', 160).notNullable().comment('name used in alphabetical lists')
    reference(t, 'institute_id', 'institutes', 'SET NULL', 'institute on record')
    t.string('institute_text', 200).notNullable().defaultTo('').comment('institute as typed')
    exactText(t, 'orcid', 19, 'ORCID iD with hyphens')
    instant(t, 'orcid_verified_at', 'when the ORCID iD was authenticated, else not verified')
    t.enum('career_stage', ['student', 'postdoc', 'staff', 'emeritus', 'other']).comment(
      'career stage, voluntary',
    )
    t.string('time_zone', 60).notNullable().defaultTo('UTC').comment('IANA zone the person reads times in')
    t.specificType('password_hash', 'VARCHAR(255) CHARACTER SET ascii COLLATE ascii_bin').comment(
      'argon2id, PHC string; null until a password is chosen',
    )
    instant(t, 'email_confirmed_at', 'when the address was proved')
    instant(t, 'disabled_at', 'when the account was shut; sessions end at once')
    t.boolean('is_demo')
      .notNullable()
      .defaultTo(false)
      .comment('account of the demonstration, refused in production')
    version(t)
    createdAt(t)
  })
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable('people')
}
