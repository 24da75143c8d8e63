import { type Logger } from 'pino';
import { type DataSource } from 'typeorm';
import { type Env } from './env';
import { type Jobs } from './jobs/jobs';
import { type Storage } from './storage/storage';

/** What every feature is given. */
export interface Deps {
  env: Env;
  db: DataSource;
  storage: Storage;
  jobs: Jobs;
  log: Logger;
  now: () => Date;
}
