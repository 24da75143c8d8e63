import { createHmac, timingSafeEqual } from 'node:crypto';
import { noticeKinds, type NoticeKind } from '../../../shared/api/notices';
import { type Env } from '../../env';

const mark = (env: Env, text: string) =>
  createHmac('sha256', env.SESSION_SECRET).update(`unsubscribe ${text}`).digest('base64url');

/** Stands for "this person does not want letters of these kinds"; it does nothing else and does not expire. */
export function unsubscribeToken(env: Env, personId: string, kinds: readonly NoticeKind[]): string {
  const text = `${personId}.${[...kinds].sort().join('+')}`;
  return `${text}.${mark(env, text)}`;
}

/** Whose and which kinds; null for a token that is not ours. */
export function readUnsubscribeToken(
  env: Env,
  token: string,
): { personId: string; kinds: NoticeKind[] } | null {
  const [personId = '', list = '', given = ''] = token.split('.');
  const wanted = mark(env, `${personId}.${list}`);
  const same =
    given.length === wanted.length && timingSafeEqual(Buffer.from(given), Buffer.from(wanted));
  const kinds = noticeKinds.filter((kind) => list.split('+').includes(kind));
  return same && kinds.length > 0 ? { personId, kinds } : null;
}
