import { type CaughtMail } from './mail-catcher';

const escapes: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};
const escapeHtml = (text: string) => text.replace(/[&<>"']/g, (sign) => escapes[sign] ?? sign);

// The values of components/ui/palette.data.ts; the server may not import from there.
const css = `
:root{--film:#F3F5F4;--sheet:#FCFDFC;--ink:#1C2226;--ink2:#434D53;--rule:#C3CBC9;--blue:#1D43B8}
@media (prefers-color-scheme:dark){:root{--film:#12171A;--sheet:#1A2125;--ink:#EDF1EF;--ink2:#C3CCCB;--rule:#38424A;--blue:#9DB8FF}}
@font-face{font-family:'Atkinson Hyperlegible Next';font-weight:400;src:url(/fonts/atkinson-hyperlegible-next-400.v1.woff2) format('woff2')}
@font-face{font-family:'Atkinson Hyperlegible Next';font-weight:700;src:url(/fonts/atkinson-hyperlegible-next-700.v1.woff2) format('woff2')}
*{box-sizing:border-box}
body{margin:0;background:var(--film);color:var(--ink);font:17px/25px 'Atkinson Hyperlegible Next',system-ui,sans-serif}
main{max-width:820px;margin:0 auto;padding:24px 16px}
h1{font-size:25px;line-height:31px;border-bottom:2.5px solid var(--ink);padding-bottom:8px;margin:0 0 16px}
a{color:var(--blue)}
ul{list-style:none;margin:0;padding:0}
li{border-bottom:1px solid var(--rule)}
li a{display:block;padding:12px 0;text-decoration:none;font-weight:700}
li a:hover{text-decoration:underline}
li span,dt{display:block;color:var(--ink2);font-weight:400}
dl{display:grid;grid-template-columns:max-content 1fr;gap:4px 16px;margin:0 0 16px}
dd{margin:0;overflow-wrap:anywhere}
pre{background:var(--sheet);border:1px solid var(--rule);padding:16px;margin:0 0 16px;white-space:pre-wrap;overflow-wrap:anywhere;font:inherit}
iframe{width:100%;height:480px;border:1px solid var(--rule);background:#fff}
button{font:inherit;min-height:48px;padding:0 16px;background:var(--sheet);color:var(--ink);border:1.5px solid var(--ink);border-radius:2px}
`;

const page = (title: string, body: string) => `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escapeHtml(title)} · Scantling, local mail</title><style>${css}</style></head>
<body><main>${body}</main></body></html>`;

const time = (iso: string) => escapeHtml(iso.replace('T', ' ').slice(0, 19));

// Addresses in the text become links, so that a confirmation is one press away.
const linked = (text: string) =>
  escapeHtml(text).replace(/https?:\/\/[^\s<>"']+/g, (url) => `<a href="${url}">${url}</a>`);

/** The list of caught mails, newest first. */
export function mailListPage(mails: CaughtMail[]): string {
  const rows = mails.toReversed().map(
    (mail) => `<li><a href="/local/mail/${mail.id}">${escapeHtml(mail.subject || '(no subject)')}
<span>to ${escapeHtml(mail.to.join(', '))} · ${time(mail.at)}</span></a></li>`,
  );
  const empty =
    '<p>No mail yet. What the application sends here shows on this page and goes nowhere else.</p>';
  return page(
    'Mail',
    `<h1>Local mail</h1>${rows.length === 0 ? empty : `<ul>${rows.join('')}</ul>`}`,
  );
}

/** One mail: its head, its text with links, and the HTML part in a frame that may run nothing. */
export function mailReadingPage(mail: CaughtMail): string {
  const frame =
    mail.html === null
      ? ''
      : `<iframe title="HTML part of the mail" sandbox="" src="/local/mail/${mail.id}/html"></iframe>`;
  return page(
    mail.subject,
    `<p><a href="/local/mail">All mail</a></p><h1>${escapeHtml(mail.subject || '(no subject)')}</h1>
<dl><dt>From</dt><dd>${escapeHtml(mail.from)}</dd><dt>To</dt><dd>${escapeHtml(mail.to.join(', '))}</dd><dt>At</dt><dd>${time(mail.at)}</dd></dl>
<pre>${linked(mail.text)}</pre>${frame}`,
  );
}

export const mailMissingPage = () =>
  page(
    'No such mail',
    '<h1>No such mail</h1><p>It may have been cleared. <a href="/local/mail">All mail</a></p>',
  );
