import { type Rule } from '../rule';
import { unresolved } from '../unresolved';

export const dimsLoop: Rule = {
  id: 'dims/loop',
  level: 'must',
  source: 'plan model §2: no dimension depends on itself',
  run: (context) => unresolved(context, 'dims/loop'),
};
