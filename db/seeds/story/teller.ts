import { randomUUID } from 'node:crypto'
import type { Actor } from '../../../lib/domain/actor.ts'
import type { ActingContext } from '../../../lib/domain/context.ts'
import type { Payments } from '../../../lib/services/payments/Payments.ts'
import type { ObjectStore } from '../../../lib/services/storage/ObjectStore.ts'
import type { Database } from '../../client.ts'
import { grantsInForce } from '../../queries/people.ts'
import type { Dice } from './random.ts'

/** Tells the past through the product's own verbs: acts as a person, at a moment set on the database's clock. */
export interface Teller {
  readonly db: Database
  /** Sets the clock of this connection; everything stamped from here on carries that moment. */
  at(moment: Date): Promise<void>
  as(name: string): Promise<ActingContext>
}

export function teller(
  db: Database,
  people: Map<string, number>,
  services: { storage: ObjectStore; payments: Payments; origin: string },
  chance: Dice,
): Teller {
  return {
    db,
    at: async (moment) => {
      await db.raw('SET SESSION timestamp = ?', [moment.getTime() / 1000])
    },
    as: async (name) => {
      const personId = people.get(name)
      if (personId === undefined) throw new Error(`nobody is called ${name}`)
      const person = await db('people').where({ id: personId }).first()
      if (!person) throw new Error(`${name} has no account`)
      const grants = await grantsInForce(db, personId)
      const actor: Actor = {
        personId,
        name: person.name,
        email: person.email,
        timeZone: person.time_zone,
        grants: grants.map((grant) => ({
          role: grant.role,
          callId: grant.call_id,
          panelId: grant.panel_id,
          instrumentId: grant.instrument_id,
        })),
      }
      return {
        actor,
        db,
        random: { bytes: (length) => Uint8Array.from({ length }, () => Math.floor(chance.next() * 256)) },
        storage: services.storage,
        payments: services.payments,
        request: {
          id: randomUUID(),
          address: '127.0.0.1',
          userAgent: 'demonstration',
          origin: services.origin,
        },
      }
    },
  }
}
