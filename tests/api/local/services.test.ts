import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import express from 'express';
import { createTransport } from 'nodemailer';
import { Client } from 'pg';
import request from 'supertest';
import { startMailCatcher } from '../../../server/local/mail-catcher';
import { mailCatcherRouter } from '../../../server/local/mail-routes';
import { localStoreKeys, startObjectStore } from '../../../server/local/object-store';
import { startPostgres } from '../../../server/local/postgres';
import { GetObjectCommand, PutObjectCommand, S3Client } from '@aws-sdk/client-s3';

async function query(url: string, sql: string): Promise<unknown[]> {
  const client = new Client({ connectionString: url });
  await client.connect();
  const { rows } = await client.query(sql);
  await client.end();
  return rows as unknown[];
}

describe('local PostgreSQL', () => {
  it('keeps its data over a stop, and takes over what an earlier run left running', async () => {
    const dir = mkdtempSync(join(tmpdir(), 'scantling-test-'));
    const first = await startPostgres({ dir, durable: false });
    await query(first.url, 'create table held (n int); insert into held values (7); checkpoint');
    // No stop: the second start finds a live server on its folder.
    const second = await startPostgres({ dir, durable: false });
    expect(await query(second.url, 'select n from held')).toEqual([{ n: 7 }]);
    await expect(query(first.url, 'select 1')).rejects.toThrow();
    await second.stop();
    await expect(query(second.url, 'select 1')).rejects.toThrow();
    rmSync(dir, { recursive: true, force: true });
  }, 30_000);
});

describe('local object store', () => {
  it('stores objects and lets another origin read ETag and ranges', async () => {
    const store = await startObjectStore({ buckets: ['media'] });
    const s3 = new S3Client({
      endpoint: store.endpoint,
      region: 'us-east-1',
      forcePathStyle: true,
      credentials: localStoreKeys,
      requestChecksumCalculation: 'WHEN_REQUIRED',
    });
    await s3.send(new PutObjectCommand({ Bucket: 'media', Key: 'a', Body: 'abcdef' }));
    const part = await s3.send(
      new GetObjectCommand({ Bucket: 'media', Key: 'a', Range: 'bytes=2-3' }),
    );
    expect(await part.Body?.transformToString()).toBe('cd');
    const cross = await fetch(`${store.endpoint}/media/a`, {
      headers: { Origin: 'http://x.test' },
    });
    expect(cross.headers.get('access-control-allow-origin')).toBe('*');
    expect(cross.headers.get('access-control-expose-headers')).toContain('ETag');
    s3.destroy();
    await store.stop();
  });
});

describe('mail catcher', () => {
  const dir = mkdtempSync(join(tmpdir(), 'scantling-mail-'));
  afterAll(() => {
    rmSync(dir, { recursive: true, force: true });
  });

  it('catches a mail, shows it without running it, and still has it after a restart', async () => {
    const catcher = await startMailCatcher({ dir });
    const waiting = catcher.waitFor((mail) => mail.to.includes('ada@example.org'));
    await createTransport({ url: catcher.url, ignoreTLS: true }).sendMail({
      from: 'Scantling <no-reply@example.org>',
      to: 'ada@example.org',
      subject: 'Confirm – ⅜ to go',
      text: 'Open http://127.0.0.1/confirm?token=1&x=<b>',
      html: '<script>alert(1)</script><p>Hello</p>',
    });
    const mail = await waiting;
    expect(mail.subject).toBe('Confirm – ⅜ to go');
    await catcher.stop();

    const again = await startMailCatcher({ dir });
    const app = express().use(mailCatcherRouter(again));
    const list = await request(app).get('/local/mail').expect(200);
    expect(list.text).toContain('Confirm – ⅜ to go');
    const one = await request(app).get(`/local/mail/${mail.id}`).expect(200);
    expect(one.text).toContain('&lt;b&gt;');
    expect(one.text).toContain('sandbox=""');
    expect(one.headers['content-security-policy']).toContain("default-src 'none'");
    await request(app).get('/local/mail/nothing').expect(404);
    again.clear();
    await request(app).get('/local/mail.json').expect(200, []);
    await expect(again.waitFor(() => true, 20)).rejects.toThrow('Caught: none');
    await again.stop();
  });
});
