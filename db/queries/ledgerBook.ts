import type { Database } from '../client.ts'
import type { FeesRow } from '../tables.ts'
import type { MoneyAccount } from './moneyLedger.ts'

export interface FeeBook {
  reference: string
  callNumber: number
  state: FeesRow['state']
  affiliationClass: FeesRow['affiliation_class']
  currency: string
  billedMinor: number
  paidMinor: number
  waivedMinor: number
  /** Lapsed or cancelled before it was paid. */
  droppedMinor: number
  givenBackMinor: number
  /** Held or lost in disputes. */
  disputedMinor: number
  firmFeesMinor: number
  owedMinor: number
}

/** What the books say of each fee; one query. */
export async function feeBooks(db: Database): Promise<FeeBook[]> {
  const sum = (where: string, name: string) => `SUM(IF(${where}, e.amount_minor, 0)) AS ${name}`
  const rows = await db('fees as f')
    .join('proposals as p', 'p.id', 'f.proposal_id')
    .join('calls as c', 'c.id', 'p.call_id')
    .join('money_entries as e', 'e.fee_id', 'f.id')
    .groupBy('f.id')
    .orderBy('f.id')
    .select<Record<string, string>[]>(
      'p.reference',
      'c.number',
      'f.state',
      'f.affiliation_class',
      'f.currency',
      db.raw(
        [
          sum("e.movement LIKE 'billed:%' AND e.account = 'receivable'", 'billed'),
          sum(
            "e.movement LIKE 'paid:%' AND e.account = 'provider' OR e.movement LIKE 'settled:%' AND e.account = 'bank' OR e.movement LIKE 'paid-after-all:%' AND e.account = 'provider' OR e.movement LIKE 'dispute-decided:%' AND e.account = 'lost'",
            'paid',
          ),
          sum("e.account = 'waived'", 'waived'),
          sum("e.movement REGEXP '^(lapsed|cancelled|dispute-decided):' AND e.account = 'income'", 'dropped'),
          sum("e.movement LIKE 'refunded:%' AND e.account = 'owed-back'", 'back'),
          sum("e.account IN ('disputed', 'lost')", 'disputed'),
          sum("e.account = 'firm-fees'", 'firm_fees'),
          sum("e.account IN ('receivable', 'invoiced')", 'owed'),
        ].join(', '),
      ),
    )
  return rows.map((row) => ({
    reference: row.reference ?? '',
    callNumber: Number(row.number),
    state: row.state as FeesRow['state'],
    affiliationClass: row.affiliation_class as FeesRow['affiliation_class'],
    currency: row.currency ?? '',
    billedMinor: Number(row.billed),
    paidMinor: Number(row.paid),
    waivedMinor: Number(row.waived),
    droppedMinor: Number(row.dropped),
    givenBackMinor: Number(row.back),
    disputedMinor: Number(row.disputed),
    firmFeesMinor: Number(row.firm_fees),
    owedMinor: Number(row.owed),
  }))
}

export interface BookedMovement {
  id: number
  at: Date
  movement: string
  from: MoneyAccount
  to: MoneyAccount
  amountMinor: number
  currency: string
  reference: string
  callNumber: number
  affiliationClass: FeesRow['affiliation_class']
}

/** Every movement with both its sides, the newest first. */
export async function bookedMovements(db: Database): Promise<BookedMovement[]> {
  const rows = await db('money_entries as t')
    .join('money_entries as s', (on) =>
      on
        .on('s.movement', 't.movement')
        .andOn(db.raw('s.amount_minor < 0') as never)
        .andOn(db.raw('t.amount_minor > 0') as never),
    )
    .join('fees as f', 'f.id', 't.fee_id')
    .join('proposals as p', 'p.id', 'f.proposal_id')
    .join('calls as c', 'c.id', 'p.call_id')
    .orderBy([
      { column: 't.created_at', order: 'desc' },
      { column: 't.id', order: 'desc' },
    ])
    .select(
      't.id',
      't.created_at',
      't.movement',
      't.account as to_account',
      's.account as from_account',
      't.amount_minor',
      't.currency',
      'p.reference',
      'c.number',
      'f.affiliation_class',
    )
  return rows.map((row) => ({
    id: row.id,
    at: row.created_at,
    movement: row.movement,
    from: row.from_account,
    to: row.to_account,
    amountMinor: row.amount_minor,
    currency: row.currency,
    reference: row.reference,
    callNumber: row.number,
    affiliationClass: row.affiliation_class,
  }))
}

export interface AccountBalance {
  account: MoneyAccount
  currency: string
  minor: number
}

/** What stands on each account. */
export async function accountBalances(db: Database): Promise<AccountBalance[]> {
  const rows = await db('money_entries')
    .groupBy('account', 'currency')
    .select<{ account: MoneyAccount; currency: string; sum: string }[]>(
      'account',
      'currency',
      db.raw('SUM(amount_minor) AS sum'),
    )
  return rows.map(({ account, currency, sum }) => ({ account, currency, minor: Number(sum) }))
}

/** How many movements there are, and how many of them do not balance. */
export async function balanceCheck(db: Database): Promise<{ movements: number; unbalanced: number }> {
  const row = await db
    .from(
      db('money_entries').groupBy('movement', 'currency').select(db.raw('SUM(amount_minor) AS sum')).as('m'),
    )
    .first<{ movements: string; unbalanced: string }>(
      db.raw('COUNT(*) AS movements, SUM(m.sum <> 0) AS unbalanced'),
    )
  return { movements: Number(row?.movements ?? 0), unbalanced: Number(row?.unbalanced ?? 0) }
}
