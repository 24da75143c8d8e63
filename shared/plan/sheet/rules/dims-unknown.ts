import { type Rule } from '../rule';
import { unresolved } from '../unresolved';

export const dimsUnknown: Rule = {
  id: 'dims/unknown',
  level: 'must',
  source: 'plan model §2: every symbol names a dimension, every expression can be read',
  run: (context) => unresolved(context, 'dims/unknown'),
};
