import { type Deps } from '../deps';
import { startMediaWork } from './media/work';
import { startNoticeWork } from './notices/work';
import { startUploadWork } from './uploads/work';

/** Starts all work that goes on behind the requests in this process. */
export async function startWork(deps: Deps): Promise<void> {
  await startMediaWork(deps);
  await startUploadWork(deps);
  await startNoticeWork(deps);
}
