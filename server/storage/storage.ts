import {
  AbortMultipartUploadCommand,
  CompleteMultipartUploadCommand,
  CreateBucketCommand,
  CreateMultipartUploadCommand,
  DeleteObjectCommand,
  GetObjectCommand,
  HeadBucketCommand,
  HeadObjectCommand,
  PutObjectCommand,
  S3Client,
  UploadPartCommand,
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
  /** Begins a file that comes in parts; returns the store's id for it. */
  startParts(key: string, type: string): Promise<string>;
  /** An address on the media origin to PUT one part to, good for `seconds`. */
  partUrl(key: string, id: string, number: number, seconds: number): Promise<string>;
  /** Puts the parts together. */
  joinParts(key: string, id: string, parts: { number: number; etag: string }[]): Promise<void>;
  /** Gives the parts up. False when the store cannot (the local one). */
  dropParts(key: string, id: string): Promise<boolean>;
  /** A signed address for our own tools. */
  insideUrl(key: string): Promise<string>;
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

type Reading = Pick<Storage, 'get' | 'getRange' | 'read'>;

function reading(s3: S3Client, Bucket: string): Reading {
  return {
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
  };
}

type Parts = Pick<Storage, 'startParts' | 'partUrl' | 'joinParts' | 'dropParts'>;

/** Files that come in parts, straight from browsers. */
function parts(s3: S3Client, outside: S3Client, Bucket: string): Parts {
  return {
    async startParts(Key, ContentType) {
      const command = new CreateMultipartUploadCommand({ Bucket, Key, ContentType });
      const { UploadId } = await s3.send(command);
      if (!UploadId) throw new Error('the store gave no id for a file in parts');
      return UploadId;
    },
    partUrl(Key, UploadId, PartNumber, expiresIn) {
      const command = new UploadPartCommand({ Bucket, Key, UploadId, PartNumber });
      return getSignedUrl(outside, command, { expiresIn });
    },
    async joinParts(Key, UploadId, list) {
      const Parts = list.map(({ number, etag }) => ({ PartNumber: number, ETag: etag }));
      const MultipartUpload = { Parts };
      await s3.send(new CompleteMultipartUploadCommand({ Bucket, Key, UploadId, MultipartUpload }));
    },
    async dropParts(Key, UploadId) {
      try {
        await s3.send(new AbortMultipartUploadCommand({ Bucket, Key, UploadId }));
        return true;
      } catch {
        return false;
      }
    },
  };
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
    ...reading(s3, Bucket),
    async remove(Key) {
      await s3.send(new DeleteObjectCommand({ Bucket, Key }));
    },
    ...parts(s3, outside, Bucket),
    insideUrl(Key) {
      return getSignedUrl(s3, new GetObjectCommand({ Bucket, Key }), { expiresIn: 3600 });
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
