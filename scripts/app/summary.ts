import type { DemoAccount } from '../../db/seeds/accounts'
import type { Environment } from '../services/environment'

/** The one tidy block that `npm start` ends with. */
export function summary(
  env: Environment,
  accounts: readonly DemoAccount[],
  seconds: number,
  logs: string,
): string {
  const rows = accounts.map(({ role, name, email, password }) => [role, name, email, password])
  const lines = [
    '',
    `  Noctuary is ready (${seconds.toFixed(0)} s). It answers on this machine only.`,
    '',
    ...table([
      ['Application', env.NEXTAUTH_URL ?? ''],
      ['Letters', `${env.INBOX_URL}  (every letter the demo sends ends there)`],
      ['Payments', `${env.PAYMENT_MOCK_URL}  (test payments, no money moves)`],
    ]),
    '',
    '  Accounts of the demo',
    ...table(rows),
    '',
    `  Logs: ${logs}. Ctrl-C stops everything.`,
    '',
  ]
  return lines.join('\n')
}

function table(rows: readonly (readonly string[])[]): string[] {
  const widths = (rows[0] ?? []).map((_cell, column) =>
    Math.max(...rows.map((row) => row[column]?.length ?? 0)),
  )
  return rows.map((row) =>
    `    ${row.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join('  ')}`.trimEnd(),
  )
}
