import { type Deps } from '../../deps';
import { makeMailer } from '../../mail/mailer';
import { spreadCorrection } from './corrections.service';
import { sendLetters } from './letters.service';
import { queues } from './queues';

/** Corrections whose notices did not go out: a process died, or the job was lost. */
async function sweepCorrections(deps: Deps): Promise<void> {
  const open: { id: string }[] = await deps.db.query(
    `SELECT id FROM corrections WHERE spread_at IS NULL ORDER BY created_at LIMIT 20`,
  );
  for (const { id } of open) await deps.jobs.send(queues.spread, id, { correctionId: id });
}

/** Starts spreading corrections and sending letters in this process; several may do it side by side. */
export async function startNoticeWork(deps: Deps): Promise<void> {
  const mailer = makeMailer(deps.env);
  await deps.jobs.work<object>({
    queue: queues.letters,
    retryLimit: 2,
    retryDelay: 5,
    every: '* * * * *',
    run: async (_, turn) => {
      await sweepCorrections(deps);
      await sendLetters(deps, mailer, turn.signal);
    },
  });
  await deps.jobs.work<{ correctionId: string }>({
    queue: queues.spread,
    retryLimit: 5,
    retryDelay: 5,
    run: async ({ correctionId }) => void (await spreadCorrection(deps, correctionId)),
  });
}
