import { mkdirSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { ListObjectsV2Command, PutObjectCommand, S3Client } from '@aws-sdk/client-s3'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Child } from '@/scripts/services/child'
import type { DataFolder } from '@/scripts/services/folders'
import { bucketName, startObjectStore } from '@/scripts/services/objectStore'
import { anyFreePorts } from '@/scripts/services/ports'

const path = mkdtempSync(join(tmpdir(), 'object-store-'))
const below = (name: string) => join(path, name)
const folder: DataFolder = {
  mode: 'test',
  path,
  mariadb: below('mariadb'),
  objects: below('objects'),
  mail: below('mail'),
  payments: below('payments'),
  logs: below('logs'),
}
let child: Child
let client: S3Client

beforeAll(async () => {
  mkdirSync(folder.objects)
  mkdirSync(folder.logs)
  const [port = 0] = await anyFreePorts(1)
  child = await startObjectStore(folder, port)
  client = new S3Client({
    endpoint: `http://127.0.0.1:${port}`,
    region: 'us-east-1',
    forcePathStyle: true,
    requestChecksumCalculation: 'WHEN_REQUIRED',
    credentials: { accessKeyId: 'S3RVER', secretAccessKey: 'S3RVER' },
  })
}, 60_000)

afterAll(async () => {
  client.destroy()
  await child.stop()
  rmSync(path, { recursive: true })
})

// Seen to fail without the legacy ciphers: the store answered 500 as soon as a listing had a second page.
describe('the object store', () => {
  it('lists more objects than fit on one page', async () => {
    for (const Key of ['aa/1', 'bb/2', 'cc/3']) {
      await client.send(new PutObjectCommand({ Bucket: bucketName, Key, Body: Buffer.from(Key) }))
    }
    const list = (token?: string) =>
      client.send(new ListObjectsV2Command({ Bucket: bucketName, MaxKeys: 2, ContinuationToken: token }))
    const first = await list()
    expect(first.IsTruncated).toBe(true)
    const second = await list(first.NextContinuationToken)
    const keys = [...(first.Contents ?? []), ...(second.Contents ?? [])].map((object) => object.Key)
    expect(keys).toEqual(['aa/1', 'bb/2', 'cc/3'])
  })
})
