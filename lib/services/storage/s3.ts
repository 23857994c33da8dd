import {
  DeleteObjectCommand,
  GetObjectCommand,
  HeadBucketCommand,
  ListObjectsV2Command,
  PutObjectCommand,
  S3Client,
  S3ServiceException,
} from '@aws-sdk/client-s3'
import { refuse } from '@/lib/errors'
import { step } from '../step'
import type { ObjectStore } from './ObjectStore'

export interface S3Settings {
  endpoint: string
  region: string
  bucket: string
  accessKeyId: string
  secretAccessKey: string
}

const ownKey = /^[0-9a-f/-]{8,120}$/

function checked(key: string): string {
  // The local store writes keys as file paths: never let anything but our own keys through.
  if (!ownKey.test(key) || key.includes('//')) throw new Error('not a key of ours')
  return key
}

/** An object store that speaks S3; the same code serves the real service and the local one. */
export function s3Store(settings: S3Settings): ObjectStore {
  const client = new S3Client({
    endpoint: settings.endpoint,
    region: settings.region,
    forcePathStyle: true,
    credentials: { accessKeyId: settings.accessKeyId, secretAccessKey: settings.secretAccessKey },
    // The local store keeps the checksum trailer as part of the object.
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
    maxAttempts: 2,
    requestHandler: { connectionTimeout: 2_000, requestTimeout: 10_000, throwOnRequestTimeout: true },
  })
  const Bucket = settings.bucket

  const reach = async <T>(name: `storage:${string}`, call: () => Promise<T>): Promise<T> => {
    try {
      return await step(name, call)
    } catch (error) {
      if (error instanceof S3ServiceException && error.$metadata.httpStatusCode === 404)
        throw refuse.integrity('A stored document is missing. The office has been told.')
      throw refuse.unavailable('object store', error)
    }
  }

  return {
    put: (key, bytes, contentType) =>
      reach('storage:put', async () => {
        await client.send(
          new PutObjectCommand({
            Bucket,
            Key: checked(key),
            Body: bytes,
            ContentType: contentType,
            ContentLength: bytes.byteLength,
          }),
        )
      }),
    get: (key) =>
      reach('storage:get', async () => {
        const reply = await client.send(new GetObjectCommand({ Bucket, Key: checked(key) }))
        if (!reply.Body) throw new Error('the object has no body')
        return reply.Body.transformToByteArray()
      }),
    remove: (key) =>
      reach('storage:remove', async () => {
        await client.send(new DeleteObjectCommand({ Bucket, Key: checked(key) }))
      }),
    list: (prefix) =>
      reach('storage:list', async () => {
        const keys: string[] = []
        let ContinuationToken: string | undefined
        do {
          const page = await client.send(
            new ListObjectsV2Command({ Bucket, Prefix: prefix, ContinuationToken }),
          )
          for (const object of page.Contents ?? []) if (object.Key) keys.push(object.Key)
          ContinuationToken = page.NextContinuationToken
        } while (ContinuationToken)
        return keys
      }),
    isUp: async () => {
      try {
        await step('storage:head', () => client.send(new HeadBucketCommand({ Bucket })))
        return true
      } catch {
        return false
      }
    },
  }
}
