import { existsSync, readFileSync } from 'node:fs'

// `npm test` gives the whole environment. By hand, the services of `npm run dev` serve, on the test database.
const file = new URL('../../.data/dev/env.json', import.meta.url)

if (!process.env.NOCTUARY_MODE && existsSync(file)) {
  const settings = JSON.parse(readFileSync(file, 'utf8')) as Record<string, string>
  Object.assign(process.env, settings, {
    NOCTUARY_MODE: 'test',
    DATABASE_URL: settings.TEST_DATABASE_URL,
    LOG_LEVEL: 'silent',
  })
}
