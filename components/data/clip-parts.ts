import AwsS3, { type AwsS3UploadParameters } from '@uppy/aws-s3';
import Uppy from '@uppy/core';
import { noteUploadPart, getUpload, signUploadPart, type Upload } from '../../shared/api/uploads';
import { call } from './api-client';
import { patiently } from './patience';

export interface Sent {
  upload: Upload;
  file: File;
  signal: AbortSignal;
  onWait: (waiting: boolean) => void;
  /** Bytes the store has, with those under way. */
  onSent: (bytes: number) => void;
  /** Called once, with ways to pause and go on. */
  onReady: (pauser: { pause(): void; resume(): void }) => void;
}

type PartBytes = Parameters<(typeof AwsS3)['uploadPartBytes']>[0];

/** The line broke or the store is starting again: what XMLHttpRequest says when there was no answer. */
function lineBroke(error: unknown): boolean {
  const status = (error as { source?: { status?: number } | null }).source?.status;
  return status !== undefined && (status === 0 || status >= 500);
}

/** Where Uppy asks and tells: our own ledger instead of the store's list of parts. */
function ledger({ upload, onWait, signal: whole }: Sent) {
  const uploadId = upload.id;
  const sized = new Map<string, number>();
  return {
    listParts: async () => {
      const ask = () => call(getUpload, { params: { uploadId } });
      const { upload: now } = await patiently(ask, whole, onWait);
      return now.parts.map((p) => ({ PartNumber: p.number, ETag: p.etag, Size: p.bytes }));
    },
    signPart: async (_file: unknown, { partNumber }: { partNumber: number }) => {
      const params = { uploadId, number: partNumber };
      const { address, expiresIn } = await patiently(
        () => call(signUploadPart, { params }),
        whole,
        onWait,
      );
      sized.set(address, partNumber);
      return { method: 'PUT' as const, url: address, expires: expiresIn };
    },
    uploadPartBytes: async (options: PartBytes) => {
      const signal = options.signal ?? whole;
      const put = () => AwsS3.uploadPartBytes({ ...options, onComplete: () => undefined });
      const answer = await patiently(put, signal, onWait, lineBroke);
      const etag = answer.ETag;
      const bytes = (options.body as Blob).size;
      const number = sized.get(options.signature.url) ?? 0;
      // In the ledger before it counts as sent: a reload then finds it.
      const params = { uploadId, number };
      await patiently(() => call(noteUploadPart, { params, body: { etag, bytes } }), whole, onWait);
      (options.onComplete as (etag: string) => void)(etag);
      return answer;
    },
  } satisfies Record<string, unknown> & {
    signPart: (...args: never[]) => Promise<AwsS3UploadParameters>;
  };
}

/** Sends the parts of a file that the ledger does not have yet, four at a time. Rejects when it cannot go on. */
export async function sendParts(sent: Sent): Promise<void> {
  const { upload, file, signal, onSent, onReady } = sent;
  const inStore = { uploadId: upload.id, key: upload.id };
  const uppy = new Uppy({ id: upload.id });
  uppy.use(AwsS3, {
    shouldUseMultipart: true,
    limit: 4,
    getChunkSize: () => upload.partBytes,
    createMultipartUpload: () => inStore,
    // Giving up is told to our own server, by whoever gives up.
    abortMultipartUpload: () => undefined,
    completeMultipartUpload: () => ({}),
    ...ledger(sent),
  });
  const id = uppy.addFile({ name: file.name, type: file.type, data: file });
  // As if it had been begun before: Uppy then always asks the ledger first.
  uppy.setFileState(id, { s3Multipart: inStore } as object);
  uppy.on('upload-progress', (_file, { bytesUploaded }) => onSent(bytesUploaded));
  onReady({ pause: () => uppy.pauseAll(), resume: () => uppy.resumeAll() });
  const giveUp = () => uppy.cancelAll();
  signal.addEventListener('abort', giveUp);
  try {
    const result = await uppy.upload();
    signal.throwIfAborted();
    const failed = result?.failed?.[0];
    if (failed) throw new Error(failed.error ?? 'the upload broke off');
  } finally {
    signal.removeEventListener('abort', giveUp);
    uppy.destroy();
  }
}
