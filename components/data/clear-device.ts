import { clearKeptFiles } from './kept-files';
import { forgetLastPerson } from './last-person';
import { clearOutbox } from './outbox';

/** After signing out: entries, pictures, clips and who it was go from this device. */
export async function clearDevice(personId: string): Promise<void> {
  forgetLastPerson();
  await clearOutbox(personId);
  await clearKeptFiles();
}
