import { Router, type Response } from 'express';
import { type MailCatcher } from './mail-catcher';
import { mailListPage, mailMissingPage, mailReadingPage } from './mail-page';

// Stricter than the application's own policy: these pages run nothing.
const policy =
  "default-src 'none'; style-src 'unsafe-inline'; font-src 'self'; frame-src 'self'; frame-ancestors 'self'; form-action 'none'";

function sendPage(response: Response, html: string): void {
  response.set('Content-Security-Policy', policy);
  response.set('X-Frame-Options', 'SAMEORIGIN');
  response.set('Cache-Control', 'no-store');
  response.type('html').send(html);
}

/** Pages to read caught mail, mounted at the root: `/local/mail`, one mail, and `/local/mail.json`. Development only. */
export function mailCatcherRouter(catcher: Pick<MailCatcher, 'messages'>): Router {
  const router = Router();
  const find = (id: string) => catcher.messages().find((mail) => mail.id === id);
  router.get('/local/mail', (_request, response) => {
    sendPage(response, mailListPage(catcher.messages()));
  });
  router.get('/local/mail.json', (_request, response) => {
    response.set('Cache-Control', 'no-store').json(catcher.messages());
  });
  router.get('/local/mail/:id', (request, response) => {
    const mail = find(request.params.id);
    if (mail === undefined) response.status(404);
    sendPage(response, mail === undefined ? mailMissingPage() : mailReadingPage(mail));
  });
  router.get('/local/mail/:id/html', (request, response) => {
    const mail = find(request.params.id);
    if (mail?.html == null) response.status(404);
    sendPage(response, mail?.html ?? mailMissingPage());
  });
  return router;
}
