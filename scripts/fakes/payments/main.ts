// The payment mock as a program: settings come from the environment.
import { PaymentMock } from './mock'

const mock = await PaymentMock.start({
  folder: process.env.PAYMENTS_FOLDER ?? '.data/payments',
  port: Number(process.env.PAYMENTS_PORT ?? 4242),
  webhook: { url: process.env.WEBHOOK_URL ?? '', secret: process.env.WEBHOOK_SECRET ?? '' },
})
process.once('SIGTERM', () => void mock.close().then(() => process.exit(0)))
console.log('The payment mock is ready.')
