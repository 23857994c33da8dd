import { launch } from './prepare/launch.mjs'

await launch(() => import('./commands/start-production.ts'))
