import { launch } from './prepare/launch.mjs'

// Whoever counts results by the closing line gets one even when nothing could be started.
await launch(
  () => import('./commands/test.ts'),
  () => console.log('0 passed, 1 failed'),
)
