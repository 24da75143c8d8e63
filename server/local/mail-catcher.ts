import { randomUUID } from 'node:crypto';
import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { simpleParser, type AddressObject } from 'mailparser';
import { SMTPServer } from 'smtp-server';

export interface CaughtMail {
  id: string;
  /** ISO time of arrival. */
  at: string;
  from: string;
  /** Envelope recipients, blind copies included. */
  to: string[];
  subject: string;
  text: string;
  html: string | null;
  headers: Record<string, string>;
}

export interface MailCatcher {
  /** `smtp://127.0.0.1:PORT` */
  url: string;
  port: number;
  /** Oldest first. */
  messages(): CaughtMail[];
  clear(): void;
  /** The first mail, caught or to come, that fits. Rejects after `timeoutMs`. */
  waitFor(fits: (mail: CaughtMail) => boolean, timeoutMs?: number): Promise<CaughtMail>;
  stop(): Promise<void>;
}

const kept = 500;

async function readMail(source: Buffer, from: string, to: string[]): Promise<CaughtMail> {
  const parsed = await simpleParser(source, { skipImageLinks: true });
  const author: AddressObject | undefined = parsed.from;
  return {
    id: randomUUID(),
    at: new Date().toISOString(),
    from: author?.text ?? from,
    to,
    subject: parsed.subject ?? '',
    text: parsed.text ?? '',
    html: typeof parsed.html === 'string' ? parsed.html : null,
    headers: Object.fromEntries(
      parsed.headerLines.map(({ key, line }) => [key, line.slice(line.indexOf(':') + 1).trim()]),
    ),
  };
}

/** Keeps mails in memory, and in a folder when there is one; the newest 500 stay. */
class MailBox {
  private readonly mails: CaughtMail[] = [];
  private readonly listeners = new Set<(mail: CaughtMail) => void>();

  constructor(private readonly dir: string | undefined) {
    if (dir === undefined) return;
    mkdirSync(dir, { recursive: true });
    for (const name of readdirSync(dir)
      .filter((file) => file.endsWith('.json'))
      .sort()) {
      try {
        this.mails.push(JSON.parse(readFileSync(join(dir, name), 'utf8')) as CaughtMail);
      } catch {
        // A mail cut off by a crash is of no use to anyone.
        rmSync(join(dir, name), { force: true });
      }
    }
  }

  private file(mail: CaughtMail): string {
    return join(this.dir ?? '', `${mail.at.replaceAll(':', '-')}-${mail.id}.json`);
  }

  add(mail: CaughtMail): void {
    this.mails.push(mail);
    if (this.dir !== undefined) writeFileSync(this.file(mail), JSON.stringify(mail));
    while (this.mails.length > kept) this.drop();
    for (const listener of this.listeners) listener(mail);
  }

  private drop(): void {
    const mail = this.mails.shift();
    if (mail !== undefined && this.dir !== undefined) rmSync(this.file(mail), { force: true });
  }

  all(): CaughtMail[] {
    return [...this.mails];
  }

  clear(): void {
    while (this.mails.length > 0) this.drop();
  }

  waitFor(fits: (mail: CaughtMail) => boolean, timeoutMs: number): Promise<CaughtMail> {
    const there = this.mails.find(fits);
    if (there !== undefined) return Promise.resolve(there);
    return new Promise((resolve, reject) => {
      const end = () => {
        clearTimeout(timer);
        this.listeners.delete(listener);
      };
      const listener = (mail: CaughtMail) => {
        if (!fits(mail)) return;
        end();
        resolve(mail);
      };
      const timer = setTimeout(() => {
        end();
        const got = this.mails.map((mail) => `${mail.to.join(', ')}: ${mail.subject}`).join('; ');
        reject(new Error(`No such mail within ${String(timeoutMs)} ms. Caught: ${got || 'none'}.`));
      }, timeoutMs);
      this.listeners.add(listener);
    });
  }
}

/** Starts an SMTP server on loopback that takes every mail and sends none on. */
export async function startMailCatcher(
  options: { port?: number; dir?: string } = {},
): Promise<MailCatcher> {
  const box = new MailBox(options.dir);
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    size: 10_000_000,
    onAuth: (_auth, _session, done) => {
      done(null, { user: 'local' });
    },
    onData: (stream, session, done) => {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('end', () => {
        const { mailFrom, rcptTo } = session.envelope;
        const to = rcptTo.map(({ address }) => address);
        readMail(Buffer.concat(chunks), mailFrom === false ? '' : mailFrom.address, to).then(
          (mail) => {
            box.add(mail);
            done();
          },
          (error: unknown) => {
            done(error instanceof Error ? error : new Error(String(error)));
          },
        );
      });
    },
  });
  // A client that hangs up in mid-sentence is its own trouble, not the catcher's.
  server.on('error', () => undefined);
  const port = await listen(server, options.port ?? 0);
  let stopped: Promise<void> | undefined;
  return {
    url: `smtp://127.0.0.1:${String(port)}`,
    port,
    messages: () => box.all(),
    clear: () => {
      box.clear();
    },
    waitFor: (fits, timeoutMs = 5000) => box.waitFor(fits, timeoutMs),
    stop: () =>
      (stopped ??= new Promise((resolve) => {
        server.close(resolve);
      })),
  };
}

function listen(server: SMTPServer, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    server.server.once('error', reject);
    const listener = server.listen(port, '127.0.0.1', () => {
      const address = listener.address();
      if (address !== null && typeof address === 'object') resolve(address.port);
      else reject(new Error('The mail catcher got no port.'));
    });
  });
}
