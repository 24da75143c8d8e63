import { parseCheck, reservedWords } from '../../../shared/measure';
import { limits } from '../../../shared/api/limits';
import {
  checkSchema,
  instruments,
  kinds,
  origins,
  senses,
  symbolPattern,
  type Check,
  type Dimension,
  type PlanDocument,
} from '../../../shared/plan/document';
import { verdictWord, type PlanModel } from '../../../shared/plan/model';
import { type ListFields, type TextLike } from './list-field';
import { choice, measured, several, text, whole } from './makers';

/** A dimension's fields beside its figure and its tolerance, which have their own. */
export const dimensionFields = (
  document: PlanDocument,
  dimension: Dimension,
): readonly TextLike<Dimension>[] => [
  text('name', 'Name'),
  text('symbol', 'Symbol', {
    mono: true,
    lazy: true,
    fault: (v, d) => {
      if (v.length > limits.symbol) return `At most ${limits.symbol} characters.`;
      if (!symbolPattern.test(v)) return 'A letter first, then letters, digits and _.';
      if (reservedWords.has(v)) return `${v} is a word of the expressions. Choose another.`;
      const other = document.dimensions.find((x) => x.symbol === v && x.id !== d.id);
      return other ? `${other.name} has this symbol already.` : undefined;
    },
  }),
  choice('origin', 'Origin', origins),
  choice('kind', 'Kind', kinds),
  choice('sense', 'Sense', senses),
  ...(dimension.sense === 'form'
    ? [
        measured<Dimension, 'over'>(document, 'over', 'Over a length of', {
          help: 'Straight, flat or square to within the figure over this length.',
          set: (d, v) => ({ ...d, over: v === '' ? undefined : v }),
        }),
      ]
    : []),
  choice('instrument', 'Measured with', instruments),
  whole('places', 'Readings asked for', 12),
  choice('counts', 'Of several readings counts', ['mean', 'min', 'max']),
  text('setting', 'Cut at one stop setting with others of this name', {
    set: (d, v) => ({ ...d, setting: v === '' ? undefined : v }),
  }),
  text('where', 'Where and how to measure'),
];

/** A check of the plan. */
export const checkFields = (model: PlanModel): ListFields<Check> => ({
  make: (id) => checkSchema.parse({ id, name: '', expression: '' }),
  name: (c) => {
    const state = model.checks.get(c.id);
    return state ? `${c.name}: ${verdictWord(state)}` : c.name;
  },
  fields: [
    text('name', 'What must be true, in a few words'),
    text('expression', 'As a statement', {
      mono: true,
      help: 'left < right · left = right within 1 mm · between(x, low, high) · fit(inner, outer, from, to)',
      fault: (value, check) => {
        if (value.trim() === '') return 'Say it as a statement.';
        const parsed = parseCheck(value);
        if (!parsed.ok)
          return `Column ${parsed.fault.at + 1}: ${parsed.fault.message} ${parsed.fault.cure ?? ''}`.trim();
        const error = model.checks.get(check.id)?.error;
        return error
          ? `Column ${error.at + 1}: ${error.message} ${error.cure ?? ''}`.trim()
          : undefined;
      },
    }),
    text('why', 'Why'),
    choice('level', 'Weight', ['must', 'should']),
    choice('asked', 'Asked', ['design', 'bench', 'both']),
    several('answeredBy', 'Answered at the bench by', [
      { value: 'figures', label: 'readings' },
      { value: 'trial', label: 'a trial' },
      { value: 'look', label: 'a look' },
    ]),
    text('how', 'For a trial or a look: what to do'),
  ],
});
