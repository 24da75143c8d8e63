import { type Rule } from '../rule';
import { unresolved } from '../unresolved';

export const dimsKind: Rule = {
  id: 'dims/kind',
  level: 'must',
  source: 'plan model §1: unlike kinds are not added',
  run: (context) => unresolved(context, 'dims/kind'),
};
