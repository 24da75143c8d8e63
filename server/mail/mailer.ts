import { createTransport } from 'nodemailer';
import { type Env } from '../env';
import { type Letter } from './letters';

export interface AddressedLetter extends Letter {
  to: string;
  /** Stable: the same letter sent twice carries the same Message-ID. */
  messageId: string;
  headers?: Record<string, string>;
}

const escape = (text: string) => text.replace(/[&<>"]/g, (c) => `&#${c.charCodeAt(0)};`);

/** The plain text as simple HTML with its links made clickable. */
export function asHtml(text: string): string {
  const paragraphs = escape(text)
    .split('\n\n')
    .map(
      (p) =>
        `<p>${p.replace(/https?:\/\/[^\s<]+/g, (url) => `<a href="${url}">${url}</a>`).replace(/\n/g, '<br>')}</p>`,
    );
  return `<!doctype html><html lang="en"><body style="font-family:sans-serif;color:#1C2226">${paragraphs.join('')}</body></html>`;
}

/** Sends letters over SMTP. */
export function makeMailer(env: Env) {
  const transport = createTransport({
    url: env.SMTP_URL,
    ignoreTLS: env.SMTP_URL.includes('127.0.0.1'),
  });
  return {
    async send(letter: AddressedLetter): Promise<void> {
      await transport.sendMail({
        from: env.MAIL_FROM,
        to: letter.to,
        subject: letter.subject,
        text: letter.text,
        html: asHtml(letter.text),
        messageId: letter.messageId,
        ...(letter.headers ? { headers: letter.headers } : {}),
      });
    },
    close: () => transport.close(),
  };
}
export type Mailer = ReturnType<typeof makeMailer>;
