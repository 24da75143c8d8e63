import { type NoticeKind } from '../../../shared/api/notices';
import { type Env } from '../../env';
import { type AddressedLetter } from '../../mail/mailer';
import { type LetterNotice } from './letters.repository';
import { unsubscribeToken } from './unsubscribe';

const kindWords: Record<NoticeKind, string> = {
  safety: 'safety corrections',
  correction: 'other corrections',
  answer: 'answers to what you wrote',
  talk: 'talk about your plans',
};

export interface LetterFacts {
  id: string;
  personId: string;
  email: string;
  name: string;
  plan: string | null;
  notices: readonly LetterNotice[];
}

function subjectOf({ plan, notices }: LetterFacts): string {
  const [first] = notices;
  if (first && notices.length === 1) return first.title;
  const safety = notices.some((n) => n.kind === 'safety') ? 'Safety: ' : '';
  return `${safety}${plan ?? 'Scantling'}, ${notices.length} notices`;
}

/**
 * One letter about one plan. Its Message-ID comes from its own id, so sending it again is the same letter. It can be
 * stopped with one click (RFC 8058), kind by kind.
 */
export function renderLetter(env: Env, facts: LetterFacts): AddressedLetter {
  const { notices, personId } = facts;
  const kinds = [...new Set(notices.map((n) => n.kind))];
  const link = (of: readonly NoticeKind[], path: string) =>
    `${env.APP_ORIGIN}${path}?token=${unsubscribeToken(env, personId, of)}`;
  const stops = kinds.map(
    (k) => `No more letters about ${kindWords[k]}:\n${link([k], '/unsubscribe')}`,
  );
  const text = [
    `Hello ${facts.name},`,
    ...notices.flatMap((n) => [
      notices.length > 1 ? `${n.title}\n${n.text}` : n.text,
      `${env.APP_ORIGIN}${n.path}`,
    ]),
    ...stops,
    'Scantling',
  ].join('\n\n');
  return {
    to: facts.email,
    subject: subjectOf(facts),
    text,
    messageId: `<notice-${facts.id}@scantling.example>`,
    headers: {
      'List-Unsubscribe': `<${link(kinds, '/api/unsubscribe')}>`,
      'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click',
      'Auto-Submitted': 'auto-generated',
    },
  };
}
