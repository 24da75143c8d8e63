/** A letter before it is addressed. */
export interface Letter {
  subject: string;
  text: string;
}

const sign = '\n\nScantling';

export const confirmLetter = (name: string, link: string): Letter => ({
  subject: 'Confirm your e-mail',
  text: `Hello ${name},\n\nplease confirm that this e-mail is yours:\n\n${link}\n\nThe link works for two days. If you did not make an account, leave this letter alone.${sign}`,
});
export const knownLetter = (name: string, link: string): Letter => ({
  subject: 'You have an account already',
  text: `Hello ${name},\n\nsomebody, probably you, tried to make an account with this e-mail. There is one already. If you do not know the password, set a new one:\n\n${link}${sign}`,
});
export const resetLetter = (name: string, link: string): Letter => ({
  subject: 'Set a new password',
  text: `Hello ${name},\n\nhere you can set a new password:\n\n${link}\n\nThe link works for one hour and once. If you did not ask for it, leave this letter alone.${sign}`,
});

export interface RulingFacts {
  name: string;
  what: string;
  act: string;
  rule: string | null;
  reasons: string;
  until: Date | null;
}
/** The statement of reasons to the person concerned. */
export const rulingLetter = (f: RulingFacts): Letter => ({
  subject: f.act === 'no action' ? `About ${f.what}: it stays` : `About ${f.what}: a ruling`,
  text:
    [
      `Hello ${f.name},`,
      `a moderator looked at ${f.what}.`,
      `What was done: ${f.act}${f.until ? ` until ${f.until.toISOString().slice(0, 10)}` : ''}.`,
      ...(f.rule ? [`The rule: ${f.rule}`] : []),
      `The facts and reasons: ${f.reasons}`,
      'The decision was made by a person. You may appeal within six months by answering this letter; another moderator then decides.',
    ].join('\n\n') + sign,
});
export const outcomeLetter = (what: string, act: string): Letter => ({
  subject: `Your report on ${what}`,
  text: `Hello,\n\na moderator looked at what you reported, ${what}. What was done: ${act}.\n\nThank you for saying something. If you disagree, answer this letter within six months; another moderator then decides.${sign}`,
});
