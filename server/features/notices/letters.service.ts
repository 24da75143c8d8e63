import { type Deps } from '../../deps';
import { type Mailer } from '../../mail/mailer';
import { renderLetter } from './letters.render';
import { claimLetters, endLetter, letterContents, type ClaimedLetter } from './letters.repository';

/** How long a sender may take over what it claimed; then it counts as dead. */
const leaseMs = 2 * 60_000;
const atOnce = 10;
const mostTries = 12;

type Sending = Pick<Deps, 'db' | 'env' | 'now' | 'log'>;

async function sendOne(deps: Sending, mailer: Mailer, letter: ClaimedLetter): Promise<boolean> {
  const { notices, person } = await letterContents(deps.db, letter);
  if (!person || notices.length === 0) {
    await endLetter(deps.db, letter.id, 'dropped', deps.now());
    return false;
  }
  try {
    await mailer.send(
      renderLetter(deps.env, {
        id: letter.id,
        personId: letter.person_id,
        email: person.email,
        name: person.display_name,
        plan: person.plan,
        notices,
      }),
    );
  } catch (error) {
    const givenUp = letter.tries >= mostTries;
    deps.log.warn({ err: error, letter: letter.id, givenUp }, 'letter');
    const wait = Math.min(60, 2 ** letter.tries) * 60_000;
    if (givenUp) await endLetter(deps.db, letter.id, 'dropped', deps.now());
    else await endLetter(deps.db, letter.id, 'later', new Date(deps.now().getTime() + wait));
    return false;
  }
  await endLetter(deps.db, letter.id, 'sent', deps.now());
  return true;
}

/**
 * Sends what is due, a few letters at a time, until nothing is left or `stop` is set. A process that dies in between
 * leaves its letters to the next one after the lease: none is lost, and only those in its hands go out twice, under the
 * same Message-ID. Gives how many went out.
 */
export async function sendLetters(
  deps: Sending,
  mailer: Mailer,
  stop: AbortSignal = new AbortController().signal,
): Promise<number> {
  let sent = 0;
  while (!stop.aborted) {
    const claimed = await claimLetters(deps.db, deps.now(), leaseMs, atOnce);
    if (claimed.length === 0) break;
    for (const letter of claimed) if (await sendOne(deps, mailer, letter)) sent += 1;
  }
  return sent;
}
