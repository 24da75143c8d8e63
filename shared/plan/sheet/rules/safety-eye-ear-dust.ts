import { removedLine } from '../removed-lines';
import { type Rule } from '../rule';

export const safetyEyeEarDust: Rule = {
  id: 'safety/eye-ear-dust',
  level: 'should',
  source: '29 CFR 1910.133 (eyes), 1910.95 (ears); NIOSH REL for wood dust',
  run: removedLine('safety/eye-ear-dust', 'eyes, ears and dust'),
};
