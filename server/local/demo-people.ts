import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

/** A sign-in of the demo data, as shown when the product has started. */
export interface DemoPerson {
  email: string;
  password: string;
  /** Who it is, in a word or two: `creator`, `moderator`. */
  who: string;
}

const file = join(__dirname, '../../assets/demo/people.json');

/** The sign-ins the demo data brings; empty while there is none. */
export function demoPeople(): DemoPerson[] {
  return existsSync(file) ? (JSON.parse(readFileSync(file, 'utf8')) as DemoPerson[]) : [];
}
