import { join } from 'node:path'
import { startChild, untilReady, type Child } from './child'
import { projectRoot, type DataFolder } from './folders'

export interface PaymentsPlan {
  folder: DataFolder
  port: number
  webhookUrl: string
  webhookSecret: string
}

/** The payment mock: hosted page, API and signed webhooks, all on loopback. */
export async function startPayments({
  folder,
  port,
  webhookUrl,
  webhookSecret,
}: PaymentsPlan): Promise<Child> {
  const child = startChild({
    name: 'the payment mock',
    command: process.execPath,
    args: ['--import', 'tsx', 'scripts/fakes/payments/main.ts'],
    cwd: projectRoot,
    env: {
      PAYMENTS_FOLDER: folder.payments,
      PAYMENTS_PORT: String(port),
      WEBHOOK_URL: webhookUrl,
      WEBHOOK_SECRET: webhookSecret,
    },
    logFile: join(folder.logs, 'payments.log'),
  })
  const health = `http://127.0.0.1:${port}/mock/health`
  await untilReady(child, async () => (await fetch(health, { signal: AbortSignal.timeout(2000) })).ok, 30)
  return child
}
