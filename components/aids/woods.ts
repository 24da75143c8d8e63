import { woodNames } from '../../shared/aids/wood';
import { type AidField, type Values } from './form-values';

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

/** The woods of the handbook as choices, in alphabetical order, another one last. */
export const woodOptions = [
  ...woodNames
    .filter((wood) => wood !== 'other')
    .sort()
    .map((value) => ({ value, label: capital(value) })),
  { value: 'other', label: 'Another wood' },
];

/** Wood and cut, and the shrinkage of another wood. */
export const woodParts = (values: Values): AidField[] => [
  { key: 'wood', label: 'Wood', kind: 'choice', options: woodOptions },
  {
    key: 'cut',
    label: 'Cut',
    kind: 'choice',
    options: [
      { value: 'flat', label: 'Flat-sawn' },
      { value: 'quarter', label: 'Quarter-sawn' },
    ],
  },
  ...(values.wood === 'other'
    ? [
        {
          key: 'shrinkage',
          label: 'Shrinkage, green to oven-dry',
          kind: 'number' as const,
          unit: '%',
          help: 'Across this cut, from a handbook',
        },
      ]
    : []),
];
