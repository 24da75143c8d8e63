import { createHash } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { GetObjectCommand, ListObjectsV2Command, S3Client } from '@aws-sdk/client-s3';
import { type Page } from 'playwright-core';
import { type Media } from '../../shared/api/media';
import { freePort } from '../../server/local/free-port';
import { launchBrowser, openPage } from './harness-page';
import { bigClip, removeBig, uploadStage, type UploadStage } from './upload-stage';

const odalys = { email: 'odalys@marrow-lane.example', password: 'cut once measure twice' };
const mib = 1024 * 1024;
const bytes = (process.env.SCANTLING_LONG ? 1024 : 64) * mib;

let stage: UploadStage;
let path: string;
beforeAll(async () => {
  path = bigClip(bytes);
  stage = await uploadStage(await freePort());
}, 120_000);
afterAll(async () => {
  await stage.close();
  removeBig(path);
}, 60_000);

async function hashed(stream: AsyncIterable<unknown>): Promise<string> {
  const hash = createHash('sha256');
  for await (const chunk of stream) hash.update(chunk as Buffer);
  return hash.digest('hex');
}

/** What the store holds of files as they were sent, by hash. */
async function sources(): Promise<string[]> {
  const credentials = { accessKeyId: 'S3RVER', secretAccessKey: 'S3RVER' };
  const s3 = new S3Client({
    endpoint: stage.store,
    region: 'us-east-1',
    forcePathStyle: true,
    credentials,
  });
  const Bucket = 'scantling';
  const list = await s3.send(new ListObjectsV2Command({ Bucket, Prefix: 'source/upload-' }));
  const hashes: string[] = [];
  for (const { Key } of list.Contents ?? []) {
    const { Body } = await s3.send(new GetObjectCommand({ Bucket, Key }));
    hashes.push(await hashed(Body as AsyncIterable<unknown>));
  }
  return hashes;
}

async function choose(page: Page, file: string): Promise<void> {
  const chooser = page.waitForEvent('filechooser');
  await page.getByRole('button', { name: 'Clip file' }).click();
  await (await chooser).setFiles(file);
}

const limit = process.env.SCANTLING_LONG ? 600_000 : 90_000;

describe('a large clip goes straight to the store', () => {
  it(
    'over five cut lines, a reload, a killed server and a pause, byte for byte, and the server stays small',
    async () => {
      const browser = await launchBrowser();
      const opened = await openPage(browser, stage.base, { width: 1280, as: odalys });
      const { page } = opened;
      page.setDefaultTimeout(limit);
      try {
        await page.goto('/drafting');
        await page.getByLabel('Title of a new plan').fill(`Large ${Date.now()}`);
        await page.getByRole('button', { name: 'Begin the plan' }).click();
        await page.getByRole('heading', { level: 2, name: 'Clip' }).waitFor();
        const before = stage.serverMb();
        let most = before;
        const watch = setInterval(() => (most = Math.max(most, stage.serverMb())), 50);
        const { line } = stage;
        // The line breaks four times in the middle of parts; at the fifth the page is loaded anew.
        let cuts = 0;
        for (const share of [0.1, 0.2, 0.3, 0.4])
          line.at(share * bytes, () => {
            cuts += 1;
            line.cut();
          });
        const reached = new Promise<void>((resolve) =>
          line.at(0.6 * bytes, () => {
            line.hold(true);
            resolve();
          }),
        );
        await choose(page, path);
        await reached;
        await page.getByRole('button', { name: 'Pause' }).click();
        await page.getByRole('button', { name: 'Go on uploading' }).waitFor();
        cuts += 1;
        line.cut();
        line.hold(false);
        await page.reload();
        await page.getByText(/broke off; .* are here\. Choose the same file again/).waitFor();
        const sent = line.up();
        const killed = new Promise<void>((resolve) => {
          line.at(sent + 0.15 * bytes, () => {
            line.hold(true);
            most = Math.max(most, stage.serverMb());
            clearInterval(watch);
            void stage.restart().then(() => {
              line.hold(false);
              resolve();
            });
          });
        });
        await choose(page, path);
        await killed;
        const again = stage.serverMb();
        let mostAgain = again;
        const watchAgain = setInterval(
          () => (mostAgain = Math.max(mostAgain, stage.serverMb())),
          50,
        );
        await page.getByLabel('Clip of the draft').waitFor();
        clearInterval(watchAgain);
        const hash = await hashed(createReadStream(path));
        expect(cuts).toBe(5);
        expect(await sources()).toEqual([hash]);
        const answer = await page.context().request.get(`/api/uploads/files/${hash}`);
        expect(((await answer.json()) as { media: Media }).media).toMatchObject({
          bytes,
          state: 'ready',
        });
        // What went over the line a second time is a part or two for each break, not the file again.
        expect(line.up() / bytes).toBeLessThan(process.env.SCANTLING_LONG ? 1.5 : 4);
        console.log(
          `server RSS, MB: ${before.toFixed(0)} before, ${most.toFixed(0)} at most; after its restart ${again.toFixed(0)}, ${mostAgain.toFixed(0)} at most`,
        );
        expect(Math.max(most - before, mostAgain - again)).toBeLessThan(100);
      } finally {
        await opened.close();
        await browser.close();
      }
    },
    limit,
  );
});
