import { createRequire } from 'node:module'
import { join } from 'node:path'
import { startChild, untilReady, type Child } from './child'
import { projectRoot, type DataFolder } from './folders'

const require = createRequire(import.meta.url)

export const bucketName = 'noctuary'

/** The object store of demo and tests: S3's protocol on loopback, files in the data folder. */
export async function startObjectStore(folder: DataFolder, port: number): Promise<Child> {
  const program = require.resolve('s3rver/bin/s3rver.js')
  const child = startChild({
    name: 'the object store',
    command: process.execPath,
    // s3rver is old: Node would warn of what it uses, and long listings need a cipher that OpenSSL 3 put away.
    args: [
      '--no-deprecation',
      '--openssl-legacy-provider',
      program,
      ...['--directory', folder.objects, '--address', '127.0.0.1', '--port', String(port)],
      ...['--no-vhost-buckets', '--allow-mismatched-signatures', '--configure-bucket', bucketName],
    ],
    cwd: projectRoot,
    logFile: join(folder.logs, 'objects.log'),
  })
  await untilReady(child, () => responds(`http://127.0.0.1:${port}/${bucketName}/is-it-up`), 30)
  return child
}

async function responds(url: string): Promise<boolean> {
  const response = await fetch(url, { signal: AbortSignal.timeout(2000) })
  return response.status < 500
}
