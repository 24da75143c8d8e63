import {
  CreateBucketCommand,
  DeleteObjectCommand,
  GetObjectCommand,
  HeadBucketCommand,
  HeadObjectCommand,
  PutObjectCommand,
  S3Client,
} from '@aws-sdk/client-s3';
import { getSignedUrl } from '@aws-sdk/s3-request-presigner';
import { type Readable } from 'node:stream';
import { type Env } from '../env';

export interface StoredFile {
  type: string;
  /** Known length; streams need it. */
  bytes: number;
}

/** The object store, by key. Keys are made from content hashes, so a put is never a change. */
export interface Storage {
  ensureBucket(): Promise<void>;
  put(key: string, body: Buffer | Readable, file: StoredFile): Promise<void>;
  has(key: string): Promise<boolean>;
  /** Length in bytes; throws when there is no such file. */
  size(key: string): Promise<number>;
  get(key: string): Promise<Buffer>;
  /** The bytes from `start` up to and with `end`. */
  getRange(key: string, start: number, end: number): Promise<Buffer>;
  /** The file as a stream; what is not read is not held in memory. */
  read(key: string): Promise<Readable>;
  remove(key: string): Promise<void>;
  /** A signed address on the media origin that stays the same within a window of half an hour. */
  signedUrl(key: string, type: string, now: Date): Promise<string>;
}

const windowMs = 30 * 60 * 1000;

function client(env: Env, endpoint: string): S3Client {
  return new S3Client({
    endpoint,
    region: env.S3_REGION,
    forcePathStyle: true,
    credentials: { accessKeyId: env.S3_ACCESS_KEY, secretAccessKey: env.S3_SECRET_KEY },
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
  });
}

/** A store on any S3-compatible service. */
export function makeStorage(env: Env): Storage {
  const s3 = client(env, env.S3_ENDPOINT);
  const outside = client(env, env.MEDIA_ORIGIN ?? env.S3_ENDPOINT);
  const Bucket = env.S3_BUCKET;
  return {
    async ensureBucket() {
      try {
        await s3.send(new HeadBucketCommand({ Bucket }));
      } catch {
        await s3.send(new CreateBucketCommand({ Bucket }));
      }
    },
    async put(Key, Body, { type, bytes }) {
      await s3.send(
        new PutObjectCommand({ Bucket, Key, Body, ContentType: type, ContentLength: bytes }),
      );
    },
    async has(Key) {
      try {
        await s3.send(new HeadObjectCommand({ Bucket, Key }));
        return true;
      } catch (error) {
        if (
          (error as { $metadata?: { httpStatusCode?: number } }).$metadata?.httpStatusCode === 404
        )
          return false;
        throw error;
      }
    },
    async size(Key) {
      return (await s3.send(new HeadObjectCommand({ Bucket, Key }))).ContentLength ?? 0;
    },
    async get(Key) {
      const { Body } = await s3.send(new GetObjectCommand({ Bucket, Key }));
      return Buffer.from((await Body?.transformToByteArray()) ?? []);
    },
    async getRange(Key, start, end) {
      const wanted = new GetObjectCommand({ Bucket, Key, Range: `bytes=${start}-${end}` });
      const { Body } = await s3.send(wanted);
      return Buffer.from((await Body?.transformToByteArray()) ?? []);
    },
    async read(Key) {
      const { Body } = await s3.send(new GetObjectCommand({ Bucket, Key }));
      return Body as Readable;
    },
    async remove(Key) {
      await s3.send(new DeleteObjectCommand({ Bucket, Key }));
    },
    signedUrl(Key, type, now) {
      const signingDate = new Date(Math.floor(now.getTime() / windowMs) * windowMs);
      const command = new GetObjectCommand({
        Bucket,
        Key,
        ResponseContentType: type,
        ResponseCacheControl: 'private, max-age=31536000, immutable',
      });
      return getSignedUrl(outside, command, { expiresIn: 2 * 3600, signingDate });
    },
  };
}
