/** Per fee: what its papers say (payments, invoices, refunds, disputes) beside what its accounts say; minor units. */
const feeWithBooks = `SELECT f.id, f.state, f.amount_minor AS amount,
    COALESCE((SELECT SUM(amount_minor) FROM payments WHERE fee_id = f.id AND state = 'succeeded'), 0) AS paid,
    COALESCE((SELECT SUM(amount_minor) FROM invoices WHERE fee_id = f.id AND state = 'settled'), 0) AS settled,
    COALESCE((SELECT SUM(amount_minor) FROM invoices WHERE fee_id = f.id AND state = 'open'), 0) AS asked,
    COALESCE((SELECT SUM(p.amount_minor) FROM payments p WHERE p.fee_id = f.id AND p.state = 'succeeded'
      AND EXISTS (SELECT 1 FROM refunds r WHERE r.payment_id = p.id AND r.is_surplus = 1)), 0) AS surplus,
    COALESCE((SELECT SUM(r.amount_minor) FROM refunds r JOIN payments p ON p.id = r.payment_id
      WHERE p.fee_id = f.id AND r.state = 'succeeded'), 0) AS back_by_card,
    COALESCE((SELECT SUM(r.amount_minor) FROM refunds r JOIN payments p ON p.id = r.payment_id
      WHERE p.fee_id = f.id AND r.state = 'succeeded' AND r.is_surplus = 1), 0) AS surplus_back,
    COALESCE((SELECT SUM(r.amount_minor) FROM refunds r JOIN invoices i ON i.id = r.invoice_id
      WHERE i.fee_id = f.id AND r.state = 'succeeded'), 0) AS back_by_bank,
    COALESCE((SELECT SUM(r.amount_minor) FROM refunds r LEFT JOIN payments p ON p.id = r.payment_id LEFT JOIN invoices i ON i.id = r.invoice_id
      WHERE COALESCE(p.fee_id, i.fee_id) = f.id AND r.state <> 'failed' AND r.is_surplus = 0), 0) AS fee_back,
    COALESCE((SELECT SUM(r.amount_minor) FROM refunds r LEFT JOIN payments p ON p.id = r.payment_id LEFT JOIN invoices i ON i.id = r.invoice_id
      WHERE COALESCE(p.fee_id, i.fee_id) = f.id AND r.state = 'created' AND r.is_surplus = 0), 0) AS fee_back_waiting,
    COALESCE((SELECT SUM(d.amount_minor) FROM disputes d JOIN payments p ON p.id = d.payment_id WHERE p.fee_id = f.id AND d.state = 'open'), 0) AS held,
    COALESCE((SELECT SUM(d.amount_minor) FROM disputes d JOIN payments p ON p.id = d.payment_id WHERE p.fee_id = f.id AND d.state = 'lost'), 0) AS gone,
    COALESCE((SELECT SUM(d.amount_minor) FROM disputes d JOIN payments p ON p.id = d.payment_id
      WHERE p.fee_id = f.id AND d.state = 'lost' AND d.decision IN ('ask-again', 'waive', 'withdraw')), 0) AS reopened,
    COALESCE(e.receivable, 0) AS receivable, COALESCE(e.invoiced, 0) AS invoiced, COALESCE(e.provider, 0) AS provider,
    COALESCE(e.bank, 0) AS bank, COALESCE(e.owed_back, 0) AS owed_back, COALESCE(e.refunds, 0) AS refunds,
    COALESCE(e.disputed, 0) AS disputed, COALESCE(e.lost, 0) AS lost, COALESCE(e.firm_fees, 0) AS firm_fees,
    COALESCE(e.income, 0) AS income, COALESCE(e.waived, 0) AS waived
  FROM fees f LEFT JOIN (SELECT fee_id,
      SUM(IF(account = 'receivable', amount_minor, 0)) receivable, SUM(IF(account = 'invoiced', amount_minor, 0)) invoiced,
      SUM(IF(account = 'provider', amount_minor, 0)) provider, SUM(IF(account = 'bank', amount_minor, 0)) bank,
      SUM(IF(account = 'owed-back', amount_minor, 0)) owed_back, SUM(IF(account = 'refunds', amount_minor, 0)) refunds,
      SUM(IF(account = 'disputed', amount_minor, 0)) disputed, SUM(IF(account = 'lost', amount_minor, 0)) lost,
      SUM(IF(account = 'firm-fees', amount_minor, 0)) firm_fees, SUM(IF(account = 'income', amount_minor, 0)) income,
      SUM(IF(account = 'waived', amount_minor, 0)) waived
    FROM money_entries GROUP BY fee_id) e ON e.fee_id = f.id`

const books = (broken: string) => `SELECT id FROM (${feeWithBooks}) b WHERE ${broken}`

const noGaps = (table: 'receipts' | 'invoices' | 'credit_notes') =>
  `SELECT 1 AS gap FROM ${table} GROUP BY SUBSTRING(number, 4, 4)
    HAVING MAX(CAST(SUBSTRING_INDEX(number, '-', -1) AS UNSIGNED)) <> COUNT(*)`

/** What is promised about money, each as a query that must find nothing. */
export const promisesOfMoney: readonly (readonly [name: string, sql: string])[] = [
  [
    'I2 a paid fee was paid once, whatever was given back of it since; another fee was not paid',
    books(
      `(state IN ('paid', 'refunded') AND paid + settled - surplus - reopened <> amount)
        OR (state = 'paid' AND fee_back >= amount) OR (state = 'refunded' AND fee_back = 0) OR fee_back > amount
        OR (state NOT IN ('paid', 'refunded') AND paid + settled - surplus - reopened <> 0)`,
    ),
  ],
  [
    'I2 a succeeded payment has one receipt',
    `SELECT p.id FROM payments p LEFT JOIN receipts r ON r.payment_id = p.id WHERE p.state = 'succeeded' GROUP BY p.id HAVING COUNT(r.id) <> 1`,
  ],
  [
    'I2 every movement of money sums to zero, in one currency, that of its fee',
    `SELECT e.movement FROM money_entries e JOIN fees f ON f.id = e.fee_id GROUP BY e.movement
      HAVING SUM(e.amount_minor) <> 0 OR COUNT(*) < 2 OR COUNT(DISTINCT e.currency) <> 1 OR MAX(e.currency <> f.currency) = 1`,
  ],
  [
    'I2 the books balance as a whole',
    'SELECT currency FROM money_entries GROUP BY currency HAVING SUM(amount_minor) <> 0',
  ],
  [
    'I2 what is owed in the books is what fees and invoices say is owed',
    books(
      `receivable <> IF(state = 'due', amount, 0) OR invoiced <> asked OR (state = 'invoiced') <> (asked > 0)`,
    ),
  ],
  [
    'I2 what the books hold at firm and bank is what payments, refunds and disputes leave',
    books(
      `provider + disputed + lost + firm_fees <> paid - reopened - back_by_card OR bank <> settled - back_by_bank
        OR disputed <> held OR lost <> gone - reopened OR firm_fees < 0`,
    ),
  ],
  [
    'I2 what the books say is to be given back is what refunds wait for',
    books('refunds <> fee_back OR -owed_back <> fee_back_waiting + surplus - surplus_back'),
  ],
  [
    'I2 what was billed, waived or dropped is in the books as such',
    books(
      `-income <> IF(state IN ('lapsed', 'cancelled'), 0, amount) OR waived <> IF(state = 'waived', amount, 0)`,
    ),
  ],
  [
    'I2 only a lost dispute is decided, by somebody or nobody any more, and then at a time',
    `SELECT id FROM disputes WHERE (decision IS NULL) <> (decided_at IS NULL) OR (decision IS NOT NULL AND state = 'open')`,
  ],
  ['I2 receipt numbers have no gaps', noGaps('receipts')],
  ['I2 invoice numbers have no gaps', noGaps('invoices')],
  ['I2 credit note numbers have no gaps', noGaps('credit_notes')],
  [
    'I2 a refund that was made, and an invoice that was cancelled, has one credit note',
    `SELECT r.id FROM refunds r LEFT JOIN credit_notes c ON c.refund_id = r.id WHERE r.state = 'succeeded' GROUP BY r.id HAVING COUNT(c.id) <> 1
      UNION ALL SELECT i.id FROM invoices i LEFT JOIN credit_notes c ON c.invoice_id = i.id AND c.refund_id IS NULL
        WHERE i.state = 'cancelled' GROUP BY i.id HAVING COUNT(c.id) <> 1`,
  ],
  [
    'I2 the full fee of a kind is the rate of everybody else',
    `SELECT k.id FROM call_kinds k JOIN fee_rates r ON r.call_kind_id = k.id AND r.affiliation_class = 'other' WHERE r.amount_minor <> k.fee_minor`,
  ],
]
