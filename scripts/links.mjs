import { launch } from './prepare/launch.mjs'

await launch(() => import('./commands/links.ts'))
